import type { AccountDto, Permission, SignInRequest } from '@lampwright/contracts';
import { createContext, use } from 'react';

export type Session =
  | { state: 'loading' }
  /** Nobody is signed in; `ended` when the server closed a session that was open here. */
  | { state: 'out'; ended: boolean }
  /** `confirmed` is false while the server has not been reached yet: the account is the one kept on this device. */
  | { state: 'in'; account: AccountDto; confirmed: boolean }
  /** Nobody is known here and the server cannot be reached. */
  | { state: 'unreachable'; error: unknown };

export interface SessionControl {
  session: Session;
  signIn: (request: SignInRequest) => Promise<void>;
  signOut: () => Promise<void>;
  /** Takes over what the server says of this person after a change. */
  replace: (account: AccountDto) => void;
  retry: () => void;
}

export const SessionContext = createContext<SessionControl | null>(null);

export function useSession(): SessionControl {
  const control = use(SessionContext);
  if (!control) throw new Error('useSession needs a SessionProvider above it.');
  return control;
}

/** The person who is signed in; only below the gate that asks for one. */
export function useAccount(): AccountDto {
  const { session } = useSession();
  if (session.state !== 'in') throw new Error('useAccount needs a person who is signed in.');
  return session.account;
}

export function useMay(permission: Permission): boolean {
  return useAccount().permissions.includes(permission);
}
