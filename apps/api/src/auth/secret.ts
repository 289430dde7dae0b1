import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Settings } from '../common/settings';

const SECRET_FILE = 'secret';
const SECRET_BYTES = 48;

/** The secret that signs access tokens: from the environment, or made once and kept in the data folder. */
export function readSecret({ secret, dataDir }: Pick<Settings, 'secret' | 'dataDir'>): string {
  if (secret !== null) return secret;
  const file = join(dataDir, SECRET_FILE);
  if (!existsSync(file)) {
    writeFileSync(file, randomBytes(SECRET_BYTES).toString('base64url'), { mode: 0o600 });
  }
  return readFileSync(file, 'utf8').trim();
}
