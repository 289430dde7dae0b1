import * as argon2 from '@node-rs/argon2';
import { hashPassword, verifyPassword } from './passwords';

jest.mock('@node-rs/argon2', () => {
  const real = jest.requireActual<typeof argon2>('@node-rs/argon2');
  return { ...real, verify: jest.fn(real.verify) };
});
const verify = jest.mocked(argon2.verify);

const costOf = (hash: unknown) => String(hash).split('$').slice(0, 4).join('$');

it('tells the right password from a wrong one', async () => {
  const hash = await hashPassword('some password');
  expect(await verifyPassword(hash, 'some password')).toBe(true);
  expect(await verifyPassword(hash, 'another')).toBe(false);
});

it('salts', async () => {
  expect(await hashPassword('some password')).not.toBe(await hashPassword('some password'));
});

it('checks an unknown account against a hash of the same cost, and says no whatever comes', async () => {
  const hash = await hashPassword('some password');
  verify.mockClear();
  expect(await verifyPassword(null, 'a password that no account has')).toBe(false);
  expect(verify).toHaveBeenCalledTimes(1);
  expect(costOf(verify.mock.calls[0]![0])).toBe(costOf(hash));
});
