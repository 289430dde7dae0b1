import { Module } from '@nestjs/common';
import { TrailersController } from './trailers.controller';
import { TrailersService } from './trailers.service';

/** The trailers of the yard. */
@Module({ controllers: [TrailersController], providers: [TrailersService] })
export class TrailersModule {}
