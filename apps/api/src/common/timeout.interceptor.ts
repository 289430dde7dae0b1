import { Inject, Injectable, type CallHandler, type NestInterceptor } from '@nestjs/common';
import { timeout, type Observable } from 'rxjs';
import { SETTINGS, type Settings } from './settings';

/** Makes a hang visible: a request that takes too long is answered with the problem `timeout`. */
@Injectable()
export class TimeoutInterceptor implements NestInterceptor {
  constructor(@Inject(SETTINGS) private readonly settings: Settings) {}

  intercept(_context: unknown, next: CallHandler): Observable<unknown> {
    return next.handle().pipe(timeout(this.settings.requestTimeout));
  }
}
