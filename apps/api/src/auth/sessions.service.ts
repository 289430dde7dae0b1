import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { uuidv7 } from 'uuidv7';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problem.exception';
import type { Person } from '../people/person.entity';
import type { AccessClaims } from './access-claims';
import { ACCESS_SECONDS, REFRESH_SECONDS, type Tokens } from './cookies';
import { createRefreshToken, parseRefreshToken, type RefreshToken } from './refresh-token';
import { Session } from './session.entity';
import type { SignedIn } from './signed-in';

/** How long a replaced refresh token still works: its answer may have been lost on a weak signal. */
const GRACE_MS = 60_000;

/** Sessions: one a device, each with a refresh token that is replaced at every use. */
@Injectable()
export class SessionsService {
  constructor(
    private readonly em: EntityManager,
    private readonly jwt: JwtService,
    private readonly clock: Clock,
  ) {}

  /** Begins a session, and forgets those of the person that are too old to be used. The caller flushes. */
  async start(person: Person, deviceName: string): Promise<Tokens> {
    const now = this.clock.now();
    await this.em.nativeDelete(Session, { person: person.id, expiresAt: { $lte: now } });
    const id = uuidv7();
    const token = createRefreshToken(id);
    this.em.create(Session, {
      id,
      person,
      tokenHash: token.hash,
      deviceName,
      createdAt: now,
      lastUsedAt: now,
      expiresAt: after(now, REFRESH_SECONDS),
    });
    return { access: await this.accessToken(person.id, id), refresh: token.text };
  }

  /**
   * Replaces the tokens of a session. A refresh token that was replaced before, and not a moment ago, was copied:
   * the session ends for whoever holds it. One transaction, since two tabs may ask at once and both must go on.
   */
  async refresh(text: string): Promise<Tokens & SignedIn> {
    const presented = parseRefreshToken(text);
    if (!presented) throw new ProblemException('sessionEnded');
    const refreshed = await this.em.transactional(() => this.rotate(presented));
    if (!refreshed) throw new ProblemException('sessionEnded');
    const { session, person, refresh } = refreshed;
    return { session, person, refresh, access: await this.accessToken(person.id, session.id) };
  }

  /** Gives the new refresh token; ends the session and gives nothing for one that was copied. */
  private async rotate(presented: RefreshToken): Promise<(SignedIn & { refresh: string }) | null> {
    const { session, person } = await this.requireLive(presented.sessionId);
    const now = this.clock.now();
    const retired = session.retired.filter(({ until }) => until > now.getTime());
    const valid = [session.tokenHash, ...retired.map(({ hash }) => hash)];
    if (!valid.includes(presented.hash)) {
      session.endedAt = now;
      return null;
    }
    const next = createRefreshToken(session.id);
    session.retired = [...retired, { hash: session.tokenHash, until: now.getTime() + GRACE_MS }];
    session.tokenHash = next.hash;
    session.lastUsedAt = now;
    session.expiresAt = after(now, REFRESH_SECONDS);
    return { session, person, refresh: next.text };
  }

  /** @throws ProblemException `sessionEnded` or `accountClosed`. */
  async requireLive(sessionId: string): Promise<SignedIn> {
    const session = await this.em.findOne(Session, sessionId, { populate: ['person'] });
    if (session?.person.closed) throw new ProblemException('accountClosed');
    if (!session || session.endedAt || session.expiresAt <= this.clock.now()) {
      throw new ProblemException('sessionEnded');
    }
    return { session, person: session.person };
  }

  /** The live sessions of a person, the one used last first. */
  listLive(personId: string): Promise<Session[]> {
    return this.em.find(
      Session,
      { person: personId, endedAt: null, expiresAt: { $gt: this.clock.now() } },
      { orderBy: { lastUsedAt: 'desc', id: 'desc' } },
    );
  }

  /** Ends one session of a person. @throws NotFoundError when the person has no such session. */
  async end(personId: string, sessionId: string): Promise<void> {
    const session = await this.em.findOneOrFail(Session, { id: sessionId, person: personId });
    session.endedAt ??= this.clock.now();
    await this.em.flush();
  }

  /** Ends the session that a refresh token belongs to, if the token is valid. */
  async endByToken(text: string): Promise<void> {
    const token = parseRefreshToken(text);
    if (!token) return;
    const session = await this.em.findOne(Session, { id: token.sessionId, tokenHash: token.hash });
    if (session) session.endedAt ??= this.clock.now();
    await this.em.flush();
  }

  /** Ends the sessions of a person, all or all but one. The caller flushes. */
  async endAll(personId: string, exceptId?: string): Promise<void> {
    for (const session of await this.listLive(personId)) {
      if (session.id !== exceptId) session.endedAt = this.clock.now();
    }
  }

  private accessToken(personId: string, sessionId: string): Promise<string> {
    const claims: AccessClaims = { sub: personId, sid: sessionId };
    return this.jwt.signAsync(claims, { expiresIn: ACCESS_SECONDS });
  }
}

function after(time: Date, seconds: number): Date {
  return new Date(time.getTime() + seconds * 1000);
}
