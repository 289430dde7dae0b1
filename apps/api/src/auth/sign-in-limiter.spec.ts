import { Clock } from '../common/clock';
import { ProblemException } from '../common/problem.exception';
import { SignInLimiter } from './sign-in-limiter';

const START = Date.parse('2026-12-01T08:00:00Z');
let now: number;
let limiter: SignInLimiter;

beforeEach(() => {
  now = START;
  const clock = new Clock();
  jest.spyOn(clock, 'now').mockImplementation(() => new Date(now));
  limiter = new SignInLimiter(clock);
});

/** Seconds that an attempt would have to wait; 0 for none. */
function wait(email: string, address: string): number {
  try {
    limiter.assertAllowed(email, address);
    return 0;
  } catch (error) {
    return (error as ProblemException).extras.retryAfter ?? Number.NaN;
  }
}

function fail(times: number, email = 'a@yard.example', address = '10.0.0.1'): void {
  for (let i = 0; i < times; i++) limiter.recordFailure(email, address);
}

it('lets a person mistype a few times', () => {
  fail(4);
  expect(wait('a@yard.example', '10.0.0.1')).toBe(0);
});

it('doubles the wait from then on, up to a quarter of an hour', () => {
  fail(5);
  expect(wait('a@yard.example', '10.0.0.1')).toBe(2);
  fail(1);
  expect(wait('a@yard.example', '10.0.0.1')).toBe(4);
  fail(20);
  expect(wait('a@yard.example', '10.0.0.1')).toBe(900);
});

it('slows an account down from any address, and others not', () => {
  fail(5);
  expect(wait('a@yard.example', '10.0.0.2')).toBe(2);
  expect(wait('b@yard.example', '10.0.0.1')).toBe(0);
});

it('slows an address down over many accounts, much later', () => {
  for (let i = 0; i < 31; i++) fail(1, `person-${i}@yard.example`);
  expect(wait('new@yard.example', '10.0.0.1')).toBe(2);
  expect(wait('new@yard.example', '10.0.0.2')).toBe(0);
});

it('lets the next attempt through when the wait is over', () => {
  fail(5);
  now += 2000;
  expect(wait('a@yard.example', '10.0.0.1')).toBe(0);
});

it('forgets after an hour, and an account at the right password', () => {
  fail(5);
  limiter.recordSuccess('a@yard.example');
  expect(wait('a@yard.example', '10.0.0.1')).toBe(0);
  fail(5);
  now += 61 * 60_000;
  fail(1);
  expect(wait('a@yard.example', '10.0.0.1')).toBe(0);
});

it('keeps a bounded number of entries', () => {
  fail(5);
  for (let i = 0; i < 10_001; i++) limiter.recordFailure(`${i}@yard.example`, '10.0.0.9');
  expect(wait('a@yard.example', '10.0.0.1')).toBe(0);
});
