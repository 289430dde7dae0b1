import { resolve } from 'node:path';
import { StartError } from './start-error';

/** What the environment decides; read once, at start. */
export interface Settings {
  /** Folder of the database, its back-ups and the secret. */
  dataDir: string;
  port: number;
  /** Folder of the built web application. */
  webDir: string;
  /** True where browsers reach the server by HTTPS: cookies are then `Secure` and `__Host-`. */
  https: boolean;
  /** Express's `trust proxy`: false, a number of hops, or a list of addresses. */
  trustProxy: boolean | number | string;
  /** What an empty database is filled with: the demo yard, the yard without finished traces, or one lead. */
  demo: 'full' | 'yard' | 'none';
  /** Signs the access tokens; `null` to keep one in the data folder. */
  secret: string | null;
  logLevel: string;
  /** Requests a minute that one person, or one address that is not signed in, may make. */
  requestsPerMinute: number;
  /** Milliseconds after which a request is given up. */
  requestTimeout: number;
}

/** The token under which Nest injects the settings. */
export const SETTINGS = Symbol('settings');

const DEFAULT_PORT = 3000;
const DEFAULT_REQUESTS_PER_MINUTE = 1200;
const DEFAULT_TIMEOUT_MS = 20_000;

/** Reads the settings from environment variables. Throws a sentence for a person when one makes no sense. */
export function readSettings(env: NodeJS.ProcessEnv): Settings {
  return {
    dataDir: resolve(env.LAMPWRIGHT_DATA || 'var'),
    port: wholeNumber(env, 'PORT', DEFAULT_PORT, 65_535),
    webDir: resolve(env.LAMPWRIGHT_WEB || 'dist/apps/web'),
    https: flag(env.LAMPWRIGHT_HTTPS, false),
    trustProxy: proxies(env.LAMPWRIGHT_TRUST_PROXY),
    demo:
      env.LAMPWRIGHT_DEMO === 'yard' ? 'yard' : flag(env.LAMPWRIGHT_DEMO, true) ? 'full' : 'none',
    secret: env.LAMPWRIGHT_SECRET || null,
    logLevel: env.LAMPWRIGHT_LOG || 'warn',
    requestsPerMinute: wholeNumber(
      env,
      'LAMPWRIGHT_REQUESTS_PER_MINUTE',
      DEFAULT_REQUESTS_PER_MINUTE,
      1_000_000,
    ),
    requestTimeout: DEFAULT_TIMEOUT_MS,
  };
}

function flag(value: string | undefined, fallback: boolean): boolean {
  return value === undefined || value === '' ? fallback : value !== '0' && value !== 'false';
}

function proxies(value: string | undefined): boolean | number | string {
  if (!value || value === '0' || value === 'false') return false;
  return /^\d+$/.test(value) ? Number(value) : value;
}

function wholeNumber(env: NodeJS.ProcessEnv, name: string, fallback: number, max: number): number {
  const value = env[name];
  if (value === undefined || value === '') return fallback;
  const number = Number(value);
  if (!Number.isInteger(number) || number < 0 || number > max) {
    throw new StartError(`${name} is "${value}"; it must be a whole number from 0 to ${max}.`);
  }
  return number;
}
