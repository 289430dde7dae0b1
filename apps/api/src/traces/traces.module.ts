import { Module } from '@nestjs/common';
import { TracesController } from './traces.controller';
import { TraceWritingService } from './trace-writing.service';
import { TracesService } from './traces.service';

/** Traces and their events. */
@Module({ controllers: [TracesController], providers: [TracesService, TraceWritingService] })
export class TracesModule {}
