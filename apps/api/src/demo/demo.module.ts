import { Module } from '@nestjs/common';
import { DemoAccountsService } from './demo-accounts.service';
import { DemoController } from './demo.controller';
import { FirstStartService } from './first-start.service';

/** What a fresh installation begins with. */
@Module({ controllers: [DemoController], providers: [FirstStartService, DemoAccountsService] })
export class DemoModule {}
