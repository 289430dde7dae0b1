import type { AccountDto, SignInRequest } from '@lampwright/contracts';
import { api } from '../client';

export const signIn = (body: SignInRequest) =>
  api.post<AccountDto>('auth/sign-in', body, { refresh: false });

export const signOut = () => api.post<undefined>('auth/sign-out', undefined, { refresh: false });
