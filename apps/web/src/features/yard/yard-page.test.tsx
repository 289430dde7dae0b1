import { screen, waitFor, within } from '@testing-library/react';
import { fakeServer, ok, problem } from '../../testing/fake-server';
import { account, page, trace, trailer } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const signedIn = { 'GET auth/account': ok(account()) };

describe('the Yard', () => {
  it('shows what is open, what stands here and what was signed', async () => {
    fakeServer({
      ...signedIn,
      'GET traces': ({ path }) =>
        path.includes('state=open')
          ? ok(page(trace()))
          : ok(
              page(
                trace({
                  id: 'tr2',
                  step: 'signed',
                  found: 'Tee CU-2',
                  signedAt: '2026-11-29T10:00:00.000Z',
                }),
              ),
            ),
      'GET trailers': ok(page(trailer(), trailer({ id: 't2', unit: 'K-303', bodyType: 'tank' }))),
    });
    renderAt('/');
    expect(
      await screen.findByRole('link', { name: /T-118.*Markers blow the fuse.*Narrow/s }),
    ).toHaveAttribute('href', '/traces/tr1');
    expect(await screen.findByRole('link', { name: /Tee CU-2/ })).toHaveAttribute(
      'href',
      '/traces/tr2',
    );
    expect(await screen.findByRole('link', { name: /K-303.*Tank.*No power-ups/s })).toBeVisible();
    expect(screen.getByRole('link', { name: /Start a trace/ })).toHaveAttribute(
      'href',
      '/traces/new',
    );
  });

  it('says what to do where there is nothing yet', async () => {
    fakeServer({ ...signedIn, 'GET traces': ok(page()), 'GET trailers': ok(page()) });
    renderAt('/');
    expect(await screen.findByText('No trace is open')).toBeVisible();
    expect(await screen.findByText('No trace is signed yet')).toBeVisible();
    expect(await screen.findByText('No trailer has that')).toBeVisible();
  });

  it('lets one part fail without the others, and tries it again', async () => {
    const server = fakeServer({
      ...signedIn,
      'GET traces': ok(page()),
      'GET trailers': problem(400, 'validation'),
    });
    const { user } = renderAt('/');
    const alert = await screen.findByRole('alert');
    expect(await screen.findByText('No trace is open')).toBeVisible();
    server.set('GET trailers', ok(page(trailer())));
    await user.click(within(alert).getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('T-118')).toBeVisible();
  });

  it('finds a unit while it is typed', async () => {
    const server = fakeServer({
      ...signedIn,
      'GET traces': ok(page()),
      'GET trailers': ok(page(trailer())),
    });
    const { user } = renderAt('/');
    await user.type(await screen.findByLabelText('Find a unit'), 'K-3');
    await waitFor(() => expect(server.sent('GET trailers').at(-1)?.path).toContain('search=K-3'));
  });

  it('does not offer a trainee to start a real trace', async () => {
    fakeServer({
      'GET auth/account': ok(account('trainee')),
      'GET traces': ok(page()),
      'GET trailers': ok(page()),
    });
    renderAt('/');
    expect(await screen.findByText('Traces of others')).toBeVisible();
    expect(screen.queryByRole('link', { name: /Start a trace/ })).not.toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'People' })).not.toBeInTheDocument();
  });
});
