import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { ProblemException } from '../common/problem.exception';

interface Failures {
  count: number;
  /** Milliseconds since 1970 before which no further attempt is looked at. */
  blockedUntil: number;
  forgetAt: number;
}

/** Failures that cost nothing; many people share a workshop's address. */
const FREE_FAILURES = { account: 4, address: 30 };
const LONGEST_DELAY_SECONDS = 15 * 60;
const FORGET_AFTER_MS = 60 * 60 * 1000;
/** A bound on memory; the oldest entries go first. */
const MAX_ENTRIES = 10_000;

/**
 * Slows down guessing: after some failures each further one doubles the wait, by account and by address. Nobody is
 * locked out for good. It lives in memory, since one process serves the yard.
 */
@Injectable()
export class SignInLimiter {
  private readonly failures = new Map<string, Failures>();

  constructor(private readonly clock: Clock) {}

  /** @throws ProblemException `tooManyRequests` with the seconds to wait. */
  assertAllowed(email: string, address: string): void {
    const now = this.clock.now().getTime();
    const waits = [accountKey(email), addressKey(address)].map(
      (key) => (this.failures.get(key)?.blockedUntil ?? 0) - now,
    );
    const wait = Math.max(...waits);
    if (wait > 0) {
      throw new ProblemException('tooManyRequests', { retryAfter: Math.ceil(wait / 1000) });
    }
  }

  recordFailure(email: string, address: string): void {
    this.add(accountKey(email), FREE_FAILURES.account);
    this.add(addressKey(address), FREE_FAILURES.address);
  }

  /** The right password clears the account; the address keeps what others did from it. */
  recordSuccess(email: string): void {
    this.failures.delete(accountKey(email));
  }

  private add(key: string, free: number): void {
    const now = this.clock.now().getTime();
    const known = this.failures.get(key);
    const count = known && known.forgetAt > now ? known.count + 1 : 1;
    const delay = count <= free ? 0 : Math.min(2 ** (count - free), LONGEST_DELAY_SECONDS);
    this.failures.delete(key);
    this.failures.set(key, {
      count,
      blockedUntil: now + delay * 1000,
      forgetAt: now + FORGET_AFTER_MS,
    });
    const oldest = this.failures.keys().next().value;
    if (this.failures.size > MAX_ENTRIES && oldest !== undefined) this.failures.delete(oldest);
  }
}

const accountKey = (email: string) => `account ${email}`;
const addressKey = (address: string) => `address ${address}`;
