import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import type { Request } from 'express';
import { ProblemException } from '../common/problem.exception';
import { createValidationPipe } from '../common/validation.pipe';
import { SignInDto } from './dto/sign-in.dto';

/** Runs passport's local strategy. Guards come before pipes, so the body is validated here, before it is used. */
@Injectable()
export class LocalAuthGuard extends AuthGuard('local') implements CanActivate {
  private readonly validation = createValidationPipe();

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<Request>();
    await this.validation.transform(request.body ?? {}, { type: 'body', metatype: SignInDto });
    return (await super.canActivate(context)) as boolean;
  }

  override handleRequest<T>(error: unknown, user: T | false): T {
    if (error) throw error;
    if (!user) throw new ProblemException('signInFailed');
    return user;
  }
}
