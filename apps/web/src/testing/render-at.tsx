import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { Providers } from '../app/providers';
import { routes } from '../app/routes';
import { PlannerContext } from '../lib/planner';
import { plannerInPlace } from './planner-in-place';

/** Opens the whole program at an address, as a browser would. */
export function renderAt(path: string, { planner = plannerInPlace } = {}) {
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const view = render(
    <PlannerContext value={planner}>
      <Providers>
        <RouterProvider router={router} />
      </Providers>
    </PlannerContext>,
  );
  const where = () => router.state.location.pathname + router.state.location.search;
  return { ...view, user: userEvent.setup(), where, router };
}
