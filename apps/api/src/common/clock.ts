import { Injectable } from '@nestjs/common';

/** The one source of time, so that tests can move it. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }
}
