import { screen, within } from '@testing-library/react';
import { goodPlan } from '@lampwright/harness/testing';
import { fakeServer, ok } from '../../testing/fake-server';
import { account, page, plan } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const yard = {
  'GET auth/account': ok(account('lead')),
  'GET plans': ok(page(plan())),
  'GET plans/pl1': ok(plan()),
};

const fileOf = (document: unknown) =>
  new File([JSON.stringify(document)], 'van.json', { type: 'application/json' });

describe('plans', () => {
  it('lists them and shows one with its circuits, parts and runs', async () => {
    fakeServer(yard);
    const { user } = renderAt('/plans');
    await user.click(await screen.findByRole('link', { name: 'Van, two-piece harness' }));
    const parts = await screen.findByRole('table', { name: 'Parts' });
    for (const { label } of goodPlan.parts) {
      expect(within(parts).getAllByText(label).length).toBeGreaterThan(0);
    }
    expect(screen.getByRole('table', { name: 'Circuits' })).toBeVisible();
    expect(within(screen.getByRole('table', { name: 'Runs' })).getAllByRole('row')).toHaveLength(
      goodPlan.runs.length + 1,
    );
  });

  it('lists every fault of a file and sends nothing', async () => {
    const server = fakeServer(yard);
    const { user } = renderAt('/plans/import');
    const [run, ...runs] = goodPlan.runs;
    const faulty = { ...goodPlan, name: '', runs: [{ ...run, metres: -2 }, ...runs] };
    await user.upload(await screen.findByLabelText('Plan file'), fileOf(faulty));
    expect(await screen.findByText('The plan has 2 faults')).toBeVisible();
    expect(screen.getByText('name is empty; something must stand there.')).toBeVisible();
    expect(screen.getByText(/^runs\[0\]\.metres .* is -2; it must be 0 or more\.$/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /Store/ })).not.toBeInTheDocument();
    expect(server.sent('POST plans')).toHaveLength(0);
  });

  it('stores a plan that holds together, after it was looked at', async () => {
    const server = fakeServer({ ...yard, 'POST plans': ok(plan({ revision: 1 })) });
    const { user } = renderAt('/plans/import');
    await user.upload(await screen.findByLabelText('Plan file'), fileOf(goodPlan));
    expect(await screen.findByText('The plan holds together')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Store the plan' }));
    await screen.findByRole('heading', { level: 1, name: 'Van, two-piece harness' });
    expect(server.sent('POST plans')[0]?.body).toEqual({ harness: goodPlan });
  });

  it('stores a file as the next revision of a plan', async () => {
    const server = fakeServer({ ...yard, 'POST plans/pl1/revisions': ok(plan({ revision: 3 })) });
    const { user } = renderAt('/plans/import?plan=pl1');
    await user.upload(await screen.findByLabelText('Plan file'), fileOf(goodPlan));
    await user.click(await screen.findByRole('button', { name: 'Store as the next revision' }));
    await screen.findByText('Van, two-piece harness stored as revision 3');
    expect(server.sent('POST plans/pl1/revisions')).toHaveLength(1);
  });

  it('lets only leads import', async () => {
    fakeServer({ ...yard, 'GET auth/account': ok(account('technician')) });
    renderAt('/plans/import');
    expect(await screen.findByText('Only a lead publishes plans.')).toBeVisible();
  });
});
