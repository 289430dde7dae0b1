import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Person } from '../people/person.entity';
import type { Session } from './session.entity';

/** Who asks: what the guard puts on the request as `user`. */
export interface SignedIn {
  person: Person;
  session: Session;
}

/** Hands a route method the person who is signed in, and the session. */
export const CurrentUser = createParamDecorator((_data: unknown, context: ExecutionContext) => {
  return context.switchToHttp().getRequest<Request>().user;
});
