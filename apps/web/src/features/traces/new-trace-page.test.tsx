import { screen, waitFor } from '@testing-library/react';
import { fakeServer, ok } from '../../testing/fake-server';
import { account, page, trace, trailer } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const van = trailer();
const tank = trailer({ id: 't2', unit: 'K-303', bodyType: 'tank' });
const bare = trailer({ id: 't3', unit: 'B-001', plan: null });
const busy = trailer({ id: 't4', unit: 'B-002', openTraceId: 'tr9' });

const yard = {
  'GET auth/account': ok(account()),
  'GET trailers': ok(page(van, tank, bare, busy)),
  'GET trailers/t1': ok(van),
  'GET trailers/t2': ok(tank),
  'GET trailers/t3': ok(bare),
  'GET trailers/t4': ok(busy),
};

describe('starting a trace', () => {
  it('opens it on the trailer that was picked, with one id for every try', async () => {
    const server = fakeServer({ ...yard, 'POST traces': 'unreachable' });
    const { user, where } = renderAt('/traces/new');
    await user.click(await screen.findByRole('radio', { name: /T-118/ }));
    await user.click(await screen.findByRole('button', { name: 'Start on unit T-118' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('No answer from the server.');
    expect(where()).toBe('/traces/new?trailer=t1');

    server.set('POST traces', ok({ ...trace(), id: 'tr1' }));
    await user.click(screen.getByRole('button', { name: 'Start on unit T-118' }));
    await waitFor(() => expect(where()).toBe('/traces/tr1'));
    const [first, second] = server.sent('POST traces').map(({ body }) => body);
    expect(first).toEqual({ id: expect.stringMatching(/^[0-9a-f-]{36}$/), trailerId: 't1' });
    expect(second).toEqual(first);
  });

  it('refuses a tank and says why', async () => {
    fakeServer(yard);
    const { user } = renderAt('/traces/new');
    await user.click(await screen.findByRole('radio', { name: /K-303/ }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/vapour that a spark would light/);
    expect(screen.queryByRole('button', { name: /^Start on unit/ })).not.toBeInTheDocument();
  });

  it('sends a trailer without a plan to get one', async () => {
    fakeServer(yard);
    renderAt('/traces/new?trailer=t3');
    expect(await screen.findByRole('link', { name: 'Pick a plan for it' })).toHaveAttribute(
      'href',
      '/trailers/t3/edit',
    );
  });

  it('leads to the trace that is open already', async () => {
    fakeServer(yard);
    renderAt('/traces/new?trailer=t4');
    expect(await screen.findByRole('link', { name: 'Carry on' })).toHaveAttribute(
      'href',
      '/traces/tr9',
    );
  });
});
