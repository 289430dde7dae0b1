import '@fontsource-variable/source-sans-3/wght.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers';
import { routes } from './app/routes';
import './i18n/i18n';
import { PlannerContext, plannerInWorkers } from './lib/planner';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root.');

createRoot(root).render(
  <StrictMode>
    <PlannerContext value={plannerInWorkers()}>
      <Providers>
        <RouterProvider router={createBrowserRouter(routes)} />
      </Providers>
    </PlannerContext>
  </StrictMode>,
);
