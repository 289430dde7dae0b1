import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { Providers } from '../app/providers';
import { routes } from '../app/routes';

/** Opens the whole program at an address, as a browser would. */
export function renderAt(path: string) {
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const view = render(
    <Providers>
      <RouterProvider router={router} />
    </Providers>,
  );
  const where = () => router.state.location.pathname + router.state.location.search;
  return { ...view, user: userEvent.setup(), where, router };
}
