import { Module } from '@nestjs/common';
import { TracesController } from './traces.controller';
import { TracesService } from './traces.service';

/** Traces and their events. */
@Module({ controllers: [TracesController], providers: [TracesService] })
export class TracesModule {}
