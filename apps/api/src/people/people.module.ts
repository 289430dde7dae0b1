import { Module } from '@nestjs/common';
import { AuthModule } from '../auth/auth.module';
import { PeopleController } from './people.controller';
import { PeopleService } from './people.service';

/** The accounts of the yard. */
@Module({
  imports: [AuthModule],
  controllers: [PeopleController],
  providers: [PeopleService],
})
export class PeopleModule {}
