import { Injectable } from '@nestjs/common';
import { ThrottlerGuard } from '@nestjs/throttler';
import type { Request } from 'express';

/**
 * Limits how often one person may ask. Whoever is not signed in is counted by network address; a workshop shares one,
 * so people who are signed in are counted by themselves.
 */
@Injectable()
export class RequestLimitGuard extends ThrottlerGuard {
  protected override getTracker(request: Request): Promise<string> {
    const user = request.user as { person?: { id: string } } | undefined;
    return Promise.resolve(user?.person?.id ?? request.ip ?? '');
  }
}
