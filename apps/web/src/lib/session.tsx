import type { AccountDto, SignInRequest } from '@lampwright/contracts';
import { useCallback, useEffect, useMemo, useState, type ReactNode } from 'react';
import { followTheme } from '../theme/theme-choice';
import { getAccount } from './api/account';
import { signIn as postSignIn, signOut as postSignOut } from './api/auth';
import { ApiError, NetworkError } from './api-error';
import { keptAccount } from './kept-account';
import { SessionContext, type Session } from './session-context';
import { sessionEnd } from './session-end';

/** Asks the server who is signed in; without an answer the person kept on this device stays signed in. */
async function findOut(): Promise<Session> {
  try {
    const account = await getAccount();
    await keptAccount.write(account);
    return { state: 'in', account, confirmed: true };
  } catch (error) {
    if (error instanceof ApiError && error.status === 401) {
      const known = await keptAccount.read();
      await keptAccount.forget();
      return { state: 'out', ended: known !== null };
    }
    const account = await keptAccount.read();
    return account ? { state: 'in', account, confirmed: false } : { state: 'unreachable', error };
  }
}

export function SessionProvider({ children }: { children: ReactNode }) {
  const [session, setSession] = useState<Session>({ state: 'loading' });
  const [attempt, setAttempt] = useState(0);

  useEffect(() => {
    let current = true;
    void findOut().then((found) => {
      if (current) setSession(found);
    });
    return () => {
      current = false;
    };
  }, [attempt]);

  useEffect(
    () =>
      sessionEnd.subscribe(() => {
        void keptAccount.forget();
        setSession((now) => (now.state === 'in' ? { state: 'out', ended: true } : now));
      }),
    [],
  );

  const theme = session.state === 'in' ? session.account.preferences.theme : null;
  useEffect(() => (theme ? followTheme(theme) : undefined), [theme]);

  const replace = useCallback((account: AccountDto) => {
    void keptAccount.write(account);
    setSession({ state: 'in', account, confirmed: true });
  }, []);
  const signIn = useCallback(
    async (request: SignInRequest) => replace(await postSignIn(request)),
    [replace],
  );
  const signOut = useCallback(async () => {
    try {
      await postSignOut();
    } catch (error) {
      // A session that is already gone, or a server out of reach, does not keep a person signed in here.
      if (!(error instanceof ApiError) && !(error instanceof NetworkError)) throw error;
    }
    await keptAccount.forget();
    setSession({ state: 'out', ended: false });
  }, []);
  const retry = useCallback(() => setAttempt((count) => count + 1), []);

  const control = useMemo(
    () => ({ session, signIn, signOut, replace, retry }),
    [session, signIn, signOut, replace, retry],
  );
  return <SessionContext value={control}>{children}</SessionContext>;
}
