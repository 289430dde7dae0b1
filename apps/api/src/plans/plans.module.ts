import { Module } from '@nestjs/common';
import { PlansController } from './plans.controller';
import { PlansService } from './plans.service';

/** Plans: the harness documents, by revision. */
@Module({ controllers: [PlansController], providers: [PlansService] })
export class PlansModule {}
