import { createHash, randomBytes } from 'node:crypto';

const TOKEN_BYTES = 32;

/** A refresh token as the cookie carries it: `<session id>.<secret>`. The server keeps only the hash of the secret. */
export interface RefreshToken {
  sessionId: string;
  hash: string;
}

/** Makes a token for a session; `text` goes into the cookie and nowhere else. */
export function createRefreshToken(sessionId: string): RefreshToken & { text: string } {
  const secret = randomBytes(TOKEN_BYTES).toString('base64url');
  return { sessionId, hash: hashSecret(secret), text: `${sessionId}.${secret}` };
}

/** Reads a token from a cookie; `null` when it cannot be one. */
export function parseRefreshToken(text: string): RefreshToken | null {
  const [sessionId, secret, ...rest] = text.split('.');
  return sessionId && secret && rest.length === 0 ? { sessionId, hash: hashSecret(secret) } : null;
}

/** A fast hash is enough for 256 random bits. */
function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}
