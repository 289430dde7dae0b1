import type { RouteObject } from 'react-router-dom';
import { Loading, Page } from '../ui';
import { Gate } from './gate';
import { Layout } from './layout';
import { NotFound } from './not-found';
import { RouteError } from './route-error';

const errorElement = <RouteError />;

/** A screen that is fetched when it is first opened, with its own place to break. */
function screen(
  path: string,
  load: () => Promise<{ Component: () => React.JSX.Element }>,
): RouteObject {
  return { path, lazy: load, errorElement };
}

const office: RouteObject[] = [
  screen('/', async () => ({ Component: (await import('../features/yard/yard-page')).YardPage })),
  screen('/traces', async () => ({
    Component: (await import('../features/traces/traces-page')).TracesPage,
  })),
  screen('/traces/new', async () => ({
    Component: (await import('../features/traces/new-trace-page')).NewTracePage,
  })),
  screen('/trailers', async () => ({
    Component: (await import('../features/trailers/trailers-page')).TrailersPage,
  })),
  screen('/trailers/new', async () => ({
    Component: (await import('../features/trailers/new-trailer-page')).NewTrailerPage,
  })),
  screen('/trailers/:id', async () => ({
    Component: (await import('../features/trailers/trailer-page')).TrailerPage,
  })),
  screen('/trailers/:id/edit', async () => ({
    Component: (await import('../features/trailers/edit-trailer-page')).EditTrailerPage,
  })),
  screen('/plans', async () => ({
    Component: (await import('../features/plans/plans-page')).PlansPage,
  })),
  screen('/plans/import', async () => ({
    Component: (await import('../features/plans/import-plan-page')).ImportPlanPage,
  })),
  screen('/plans/:id', async () => ({
    Component: (await import('../features/plans/plan-page')).PlanPage,
  })),
  screen('/people', async () => ({
    Component: (await import('../features/people/people-page')).PeoplePage,
  })),
  screen('/account', async () => ({
    Component: (await import('../features/account/account-page')).AccountPage,
  })),
];

export const routes: RouteObject[] = [
  {
    errorElement,
    HydrateFallback: () => (
      <Page>
        <Loading />
      </Page>
    ),
    children: [
      screen('/sign-in', async () => ({
        Component: (await import('../features/auth/sign-in-page')).SignInPage,
      })),
      {
        element: <Gate />,
        children: [
          // A trace has the whole screen to itself.
          screen('/traces/:id', async () => ({
            Component: (await import('../features/trace/trace-page')).TracePage,
          })),
          {
            element: <Layout />,
            errorElement,
            children: [...office, { path: '*', element: <NotFound /> }],
          },
        ],
      },
    ],
  },
];
