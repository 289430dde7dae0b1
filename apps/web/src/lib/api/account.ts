import type {
  AccountDto,
  ChangePasswordRequest,
  Preferences,
  SessionDto,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

export const getAccount = () => api.get<AccountDto>('account');

export const updateAccount = (body: { name?: string; preferences?: Partial<Preferences> }) =>
  api.patch<AccountDto>('account', body);

export const changePassword = (body: ChangePasswordRequest) =>
  api.post<void>('account/password', body);

export const ownSessionsKey = () => ['account', 'sessions'] as const;
export const useOwnSessions = () =>
  useSWR(ownSessionsKey(), () => api.get<SessionDto[]>('account/sessions'));

export const endOwnSession = (id: string) => api.delete(`account/sessions/${id}`);
