import { ChakraProvider } from '@chakra-ui/react';
import type { TraceRecord } from '@lampwright/trace';
import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { PlannerContext } from '../../../lib/planner';
import { SessionContext, type SessionControl } from '../../../lib/session-context';
import { account } from '../../../testing/fixtures';
import { plannerInPlace } from '../../../testing/planner-in-place';
import { system } from '../../../theme/system';
import { TapGuardProvider } from '../controls/tap-guard';
import { TraceScreen } from '../trace-screen';
import { fakeTraceServer } from './fake-trace-server';
import { memoryKeeper } from './memory-keeper';
import { openStore } from './open-store';

const session: SessionControl = {
  session: { state: 'in', account: account(), confirmed: true },
  signIn: async () => undefined,
  signOut: async () => undefined,
  replace: () => undefined,
  retry: () => undefined,
};

/** The screens of a trace on the real machine and planner, and a server with the real rules. Taps are not slowed. */
export async function renderTrace(
  record: TraceRecord,
  { pause = 0, planner = plannerInPlace } = {},
) {
  const server = fakeTraceServer(record);
  const { store } = await openStore(server.api, memoryKeeper(), record);
  render(
    <ChakraProvider value={system}>
      <SessionContext value={session}>
        <MemoryRouter>
          <PlannerContext value={planner}>
            <TapGuardProvider pause={pause}>
              <TraceScreen store={store} />
            </TapGuardProvider>
          </PlannerContext>
        </MemoryRouter>
      </SessionContext>
    </ChakraProvider>,
  );
  const user = userEvent.setup();
  return {
    server,
    store,
    user,
    heading: () => screen.getByRole('heading', { level: 1 }),
    /** Touches a button of the panel; those on the drawing have the same names. */
    tap: async (name: string | RegExp) =>
      user.click(await within(screen.getByRole('main')).findByRole('button', { name })),
    undo: async () => user.click(screen.getByRole('button', { name: /^Undo/ })),
    /** The newest event on the server, once everything is sent. */
    newest: async () => {
      await store.send();
      return server.record().events.at(-1);
    },
  };
}
