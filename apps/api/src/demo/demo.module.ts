import { Module } from '@nestjs/common';
import { DemoAccountsService } from './demo-accounts.service';
import { FirstStartService } from './first-start.service';

/** What a fresh installation begins with. */
@Module({ providers: [FirstStartService, DemoAccountsService] })
export class DemoModule {}
