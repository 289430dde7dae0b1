import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiExtension } from '@nestjs/swagger';

export const IS_PUBLIC = 'lampwright:public';

/** Lets a route be used without signing in. */
export function Public() {
  return applyDecorators(SetMetadata(IS_PUBLIC, true), ApiExtension('x-public', true));
}
