import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { ProblemException } from './problem.exception';

const SAFE_METHODS = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses a change that another site's page asks for. Browsers say where a request comes from, in `Sec-Fetch-Site`
 * or, on plain HTTP and in older ones, in `Origin`; a page cannot forge either. A program that is no browser sends
 * neither, and says so with `X-Lampwright: 1`, a header that a page of another site cannot add without a preflight,
 * which this server never grants. Needs no token, so nothing goes stale while a tablet is out of reach.
 */
@Injectable()
export class CrossSiteGuard implements CanActivate {
  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (SAFE_METHODS.includes(request.method) || isSameSite(request)) return true;
    throw new ProblemException('crossSite');
  }
}

function isSameSite(request: Request): boolean {
  const fetchSite = request.get('sec-fetch-site');
  if (fetchSite !== undefined) return fetchSite === 'same-origin';
  const origin = request.get('origin');
  if (origin !== undefined) return hostOf(origin) === request.host;
  return request.get('x-lampwright') === '1';
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
