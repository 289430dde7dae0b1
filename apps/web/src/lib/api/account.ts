import type {
  AccountDto,
  ChangePasswordRequest,
  SessionDto,
  UpdateAccountRequest,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

export const getAccount = () => api.get<AccountDto>('auth/account');

export const updateAccount = (body: UpdateAccountRequest) =>
  api.patch<AccountDto>('auth/account', body);

export const changePassword = (body: ChangePasswordRequest) =>
  api.post<undefined>('auth/account/password', body);

const ownSessionsKey = () => ['account', 'sessions'] as const;
export const useOwnSessions = () =>
  useSWR(ownSessionsKey(), () => api.get<SessionDto[]>('auth/account/sessions'));

export const endOwnSession = (id: string) => api.delete(`auth/account/sessions/${id}`);
