import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiCookieAuth, ApiExtension } from '@nestjs/swagger';
import type { Permission } from '@lampwright/contracts';
import { ApiProblems } from '../common/problem.dto';

export const PERMISSION = 'lampwright:permission';

/** Opens a route to the roles that hold the permission, and says so in the OpenAPI document. */
export function RequiresPermission(permission: Permission) {
  return applyDecorators(
    SetMetadata(PERMISSION, permission),
    ApiExtension('x-permission', permission),
    ApiCookieAuth(),
    ApiProblems(
      'notSignedIn',
      'sessionEnded',
      'accountClosed',
      'notAllowed',
      'crossSite',
      'tooManyRequests',
      'internal',
    ),
  );
}
