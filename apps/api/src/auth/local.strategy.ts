import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-local';
import type { Person } from '../people/person.entity';
import { AuthService } from './auth.service';

/** Checks an e-mail address and a password. */
@Injectable()
export class LocalStrategy extends PassportStrategy(Strategy, 'local') {
  constructor(private readonly auth: AuthService) {
    super({ usernameField: 'email', passReqToCallback: true });
  }

  validate(request: Request, email: string, password: string): Promise<Person> {
    return this.auth.checkPassword(email, password, request.ip ?? '');
  }
}
