import { screen } from '@testing-library/react';
import { fakeServer, ok, problem } from '../../testing/fake-server';
import { account, page, plan, trace, trailer } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const yard = {
  'GET auth/account': ok(account()),
  'GET trailers/t1': ok(trailer()),
  'GET traces': ok(page(trace({ step: 'signed', found: 'Tee CU-2' }))),
  'GET plans/pl1': ok(plan()),
};

describe('a trailer', () => {
  it('shows its facts, its wiring and its history', async () => {
    fakeServer(yard);
    renderAt('/trailers/t1');
    expect(await screen.findByRole('heading', { level: 1, name: 'Unit T-118' })).toBeVisible();
    expect(document.title).toBe('Unit T-118 · Lampwright');
    expect(screen.getByText('48 ft', { selector: 'dd' })).toBeVisible();
    expect(await screen.findByRole('link', { name: 'Tee CU-2' })).toHaveAttribute(
      'href',
      '/traces/tr1',
    );
    expect(await screen.findByLabelText('Circuit')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Start a trace' })).toHaveAttribute(
      'href',
      '/traces/new?trailer=t1',
    );
  });

  it('says on a tank why it is not powered up, and offers no trace', async () => {
    fakeServer({ ...yard, 'GET trailers/t1': ok(trailer({ bodyType: 'tank' })) });
    renderAt('/trailers/t1');
    expect(await screen.findByText('No power-ups on this trailer')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'Start a trace' })).not.toBeInTheDocument();
  });

  it('says that it is gone', async () => {
    fakeServer({ ...yard, 'GET trailers/t1': problem(404, 'notFound') });
    renderAt('/trailers/t1');
    expect(await screen.findByRole('alert')).toHaveTextContent('It is not there any more');
  });
});
