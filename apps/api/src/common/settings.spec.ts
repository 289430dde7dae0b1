import { resolve } from 'node:path';
import { readSettings } from './settings';

it('has settings for a start on a desk', () => {
  expect(readSettings({})).toMatchObject({
    dataDir: resolve('var'),
    port: 3000,
    webDir: resolve('dist/apps/web'),
    https: false,
    trustProxy: false,
    demo: 'full',
    secret: null,
  });
});

it('reads each from the environment', () => {
  const settings = readSettings({
    LAMPWRIGHT_DATA: '/srv/yard',
    PORT: '8080',
    LAMPWRIGHT_WEB: '/srv/web',
    LAMPWRIGHT_HTTPS: '1',
    LAMPWRIGHT_TRUST_PROXY: '2',
    LAMPWRIGHT_DEMO: '0',
    LAMPWRIGHT_SECRET: 'a secret',
    LAMPWRIGHT_LOG: 'info',
    LAMPWRIGHT_REQUESTS_PER_MINUTE: '50',
  });
  expect(settings).toMatchObject({
    dataDir: '/srv/yard',
    port: 8080,
    webDir: '/srv/web',
    https: true,
    trustProxy: 2,
    demo: 'none',
    secret: 'a secret',
    logLevel: 'info',
    requestsPerMinute: 50,
  });
});

it('trusts named proxies', () => {
  expect(readSettings({ LAMPWRIGHT_TRUST_PROXY: 'loopback' }).trustProxy).toBe('loopback');
});

it.each(['-1', '70000', 'http', '3.5'])('says what is wrong with the port %s', (PORT) => {
  expect(() => readSettings({ PORT })).toThrow(/PORT is .* whole number from 0 to 65535/);
});
