import { screen, waitFor } from '@testing-library/react';
import { fakeServer, ok, problem } from '../testing/fake-server';
import { account, page, trailer } from '../testing/fixtures';
import { renderAt } from '../testing/render-at';
import { keptAccount } from './kept-account';

const yard = { 'GET traces': ok(page()), 'GET trailers': ok(page(trailer())) };

describe('the session', () => {
  it('keeps a person signed in while the server is out of reach', async () => {
    await keptAccount.write(account());
    fakeServer({
      'GET auth/account': 'unreachable',
      'GET traces': 'unreachable',
      'GET trailers': 'unreachable',
    });
    renderAt('/');
    expect(await screen.findByRole('heading', { level: 1, name: 'Yard' })).toBeVisible();
    expect(await screen.findByText(/No answer from the server\. What you do/)).toBeVisible();
  });

  it('says so where nobody is known and the server is out of reach, and tries again', async () => {
    const server = fakeServer({ ...yard, 'GET auth/account': 'unreachable' });
    const { user } = renderAt('/');
    expect(await screen.findByRole('alert')).toHaveTextContent('No answer from the server.');
    server.set('GET auth/account', ok(account()));
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { level: 1, name: 'Yard' })).toBeVisible();
  });

  it('sends to the sign-in when the server ends the session, and says that nothing is lost', async () => {
    const server = fakeServer({ ...yard, 'GET auth/account': ok(account()) });
    const { user } = renderAt('/');
    await screen.findByText('T-118');
    const ended = problem(401, 'sessionEnded');
    server.set('GET trailers', ended);
    server.set('GET demo', ok({ people: [], password: '' }));
    server.set('POST auth/refresh', ended);
    await user.click(screen.getByRole('link', { name: 'Trailers' }));
    expect(await screen.findByText(/You are signed out on this device/)).toBeVisible();
    await expect(keptAccount.read()).resolves.toBeNull();
  });

  it('shows the next person nothing of the one before', async () => {
    const server = fakeServer({
      ...yard,
      'GET auth/account': ok(account()),
      'POST auth/sign-out': { status: 204 },
      'GET auth/account/sessions': ok([]),
      'GET demo': ok({ people: [], password: '' }),
    });
    const { user } = renderAt('/');
    await screen.findByText('T-118');
    await user.click(screen.getByRole('link', { name: 'Account' }));
    await user.click(await screen.findByRole('button', { name: 'Sign out here' }));

    const other = account('technician', { id: 'p2', name: 'Ida Holt' });
    server.set('POST auth/sign-in', ok(other));
    server.set('GET trailers', () => problem(403, 'notAllowed'));
    await user.type(await screen.findByLabelText('E-mail'), 'ida@yard.example');
    await user.type(screen.getByLabelText('Password'), 'a long password');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await screen.findByRole('heading', { level: 1, name: 'Account' });
    await user.click(screen.getByRole('link', { name: 'Yard' }));
    expect(await screen.findByText('Your role does not allow this. Ask a lead.')).toBeVisible();
    expect(screen.queryByText('T-118')).not.toBeInTheDocument();
  });

  it('shows the theme that the person chose', async () => {
    const preferences = { lengths: 'feet', theme: 'dark' } as const;
    fakeServer({ ...yard, 'GET auth/account': ok(account('lead', { preferences })) });
    renderAt('/');
    await waitFor(() => expect(document.documentElement).toHaveClass('dark'));
  });
});
