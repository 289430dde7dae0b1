import type { RequestHandler } from 'express';
import helmet from 'helmet';

const OWN = ["'self'"];

/**
 * Headers for all answers. Scripts come from this server alone and none stands inline. Styles may stand inline: the
 * web's style library injects them and cannot carry a nonce, a known and accepted limit.
 */
export function securityHeaders(https: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: { useDefaults: false, directives: directives(OWN, https) },
    strictTransportSecurity: https && { maxAge: 365 * 24 * 60 * 60 },
    crossOriginEmbedderPolicy: false,
    referrerPolicy: { policy: 'no-referrer' },
  });
}

/** The page of the OpenAPI document starts itself by an inline script; nowhere else may one. */
export function docsHeaders(https: boolean): RequestHandler {
  return helmet.contentSecurityPolicy({
    useDefaults: false,
    directives: directives([...OWN, "'unsafe-inline'"], https),
  });
}

function directives(scripts: string[], https: boolean) {
  return {
    defaultSrc: OWN,
    scriptSrc: scripts,
    styleSrc: [...OWN, "'unsafe-inline'"],
    imgSrc: [...OWN, 'blob:', 'data:'],
    fontSrc: OWN,
    connectSrc: OWN,
    workerSrc: OWN,
    manifestSrc: OWN,
    objectSrc: ["'none'"],
    baseUri: OWN,
    formAction: OWN,
    frameAncestors: ["'none'"],
    ...(https && { upgradeInsecureRequests: [] }),
  };
}
