import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { FIELD_MESSAGES } from '../common/messages';
import { ProblemException } from '../common/problem.exception';
import { Person } from '../people/person.entity';
import type { ChangePasswordDto } from './dto/change-password.dto';
import type { UpdateAccountDto } from './dto/update-account.dto';
import { hashPassword, verifyPassword } from './passwords';
import { SessionsService } from './sessions.service';
import { SignInLimiter } from './sign-in-limiter';
import type { SignedIn } from './signed-in';

/** What a person changes about the own account. */
@Injectable()
export class AccountService {
  constructor(
    private readonly em: EntityManager,
    private readonly sessions: SessionsService,
    private readonly limiter: SignInLimiter,
  ) {}

  async update({ person }: SignedIn, change: UpdateAccountDto): Promise<Person> {
    if (change.name !== undefined) person.name = change.name.trim();
    person.preferences = { ...person.preferences, ...change.preferences };
    await this.em.flush();
    return person;
  }

  /** Sets a new password and ends the sessions of all other devices. */
  async changePassword(
    { person, session }: SignedIn,
    { current, next }: ChangePasswordDto,
    address: string,
  ): Promise<void> {
    this.limiter.assertAllowed(person.email, address);
    await this.em.populate(person, ['passwordHash']);
    if (!(await verifyPassword(person.passwordHash, current))) {
      this.limiter.recordFailure(person.email, address);
      throw ProblemException.field(
        'validation',
        'current',
        'wrongPassword',
        FIELD_MESSAGES.wrongPassword,
      );
    }
    person.passwordHash = await hashPassword(next);
    await this.sessions.endAll(person.id, session.id);
    await this.em.flush();
  }
}
