import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problem.exception';
import { Person } from '../people/person.entity';
import type { Tokens } from './cookies';
import { verifyPassword } from './passwords';
import { SessionsService } from './sessions.service';
import { SignInLimiter } from './sign-in-limiter';

const UNNAMED_DEVICE = 'Unnamed device';

/** Signing in. */
@Injectable()
export class AuthService {
  constructor(
    private readonly em: EntityManager,
    private readonly sessions: SessionsService,
    private readonly limiter: SignInLimiter,
    private readonly clock: Clock,
  ) {}

  /** Finds the person by e-mail address and password; says nothing about which of the two was wrong. */
  async checkPassword(email: string, password: string, address: string): Promise<Person> {
    const key = email.trim().toLowerCase();
    this.limiter.assertAllowed(key, address);
    const person = await this.em.findOne(Person, { email: key }, { populate: ['passwordHash'] });
    if (!(await verifyPassword(person?.passwordHash ?? null, password)) || !person) {
      this.limiter.recordFailure(key, address);
      throw new ProblemException('signInFailed');
    }
    this.limiter.recordSuccess(key);
    if (person.closed) throw new ProblemException('accountClosed');
    return person;
  }

  async signIn(person: Person, deviceName: string | undefined): Promise<Tokens> {
    const tokens = await this.sessions.start(person, deviceName?.trim() || UNNAMED_DEVICE);
    person.lastSignInAt = this.clock.now();
    await this.em.flush();
    return tokens;
  }
}
