import { ChakraProvider } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { SWRConfig } from 'swr';
import { SessionProvider } from '../lib/session';
import { useSession } from '../lib/session-context';
import { swrConfig } from '../lib/swr';
import { system } from '../theme/system';
import { Toaster } from '../ui';

/** Another person gets another cache: nothing of the one before shows, not even an error. */
function FreshCache({ children }: { children: ReactNode }) {
  const { session } = useSession();
  const person = session.state === 'in' ? session.account.id : session.state;
  return (
    <SWRConfig key={person} value={{ ...swrConfig, provider: () => new Map() }}>
      {children}
    </SWRConfig>
  );
}

export function Providers({ children }: { children: ReactNode }) {
  return (
    <ChakraProvider value={system}>
      <SessionProvider>
        <FreshCache>{children}</FreshCache>
      </SessionProvider>
      <Toaster />
    </ChakraProvider>
  );
}
