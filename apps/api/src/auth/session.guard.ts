import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { may, type Permission } from '@lampwright/contracts';
import { ProblemException } from '../common/problem.exception';
import { IS_PUBLIC } from './public.decorator';
import { PERMISSION } from './requires-permission.decorator';
import type { SignedIn } from './signed-in';

/** Denies by default: a route is public, or it names a permission that the person's role must hold. */
@Injectable()
export class SessionGuard extends AuthGuard('jwt') implements CanActivate {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const targets = [context.getHandler(), context.getClass()];
    if (this.reflector.getAllAndOverride<boolean>(IS_PUBLIC, targets)) return true;

    const permission = this.reflector.getAllAndOverride<Permission | undefined>(
      PERMISSION,
      targets,
    );
    await super.canActivate(context);
    const { user } = context.switchToHttp().getRequest<{ user: SignedIn }>();
    if (permission && may(user.person.role, permission)) return true;
    throw new ProblemException('notAllowed');
  }

  override handleRequest<T>(error: unknown, user: T | false): T {
    if (error) throw error;
    if (!user) throw new ProblemException('notSignedIn');
    return user;
  }
}
