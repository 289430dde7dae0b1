import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';

const YEAR_MS = 365 * 24 * 60 * 60 * 1000;
/** Vite puts a hash of the content into the names below this folder. */
const HASHED = '/assets/';

/**
 * Serves the built web application. Addresses that are no file and not below `/api` get the page, which finds its own
 * way; a file that is missing below `/assets` stays missing, or a browser would run a page as a script.
 */
export function useWebFiles(app: NestExpressApplication, webDir: string): void {
  const page = join(webDir, 'index.html');
  app.useStaticAssets(webDir, { index: false, redirect: false, setHeaders: setCaching });
  app.use((request: Request, response: Response, next: NextFunction) => {
    const wantsPage = ['GET', 'HEAD'].includes(request.method) && !isOther(request.path);
    if (!wantsPage || !existsSync(page)) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page, { cacheControl: false }, (error) => error && next(error));
  });
}

function isOther(path: string): boolean {
  return path === '/api' || path.startsWith('/api/') || path.startsWith(HASHED);
}

function setCaching(response: Response, file: string): void {
  const hashed = file.replaceAll('\\', '/').includes(HASHED);
  response.setHeader(
    'Cache-Control',
    hashed ? `public, max-age=${YEAR_MS / 1000}, immutable` : 'no-cache',
  );
}
