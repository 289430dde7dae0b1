import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import { SETTINGS, type Settings } from '../common/settings';
import type { AccessClaims } from './access-claims';
import { readToken } from './cookies';
import { readSecret } from './secret';
import { SessionsService } from './sessions.service';
import type { SignedIn } from './signed-in';

/** Reads the access token from its cookie and looks its session up, so that an ended one is refused at once. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy, 'jwt') {
  constructor(
    @Inject(SETTINGS) settings: Settings,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: (request: Request) => readToken(request, 'access', settings.https),
      secretOrKey: readSecret(settings),
      algorithms: ['HS256'],
    });
  }

  validate(claims: AccessClaims): Promise<SignedIn> {
    return this.sessions.requireLive(claims.sid);
  }
}
