import { screen } from '@testing-library/react';
import { fakeServer, ok, problem } from '../../testing/fake-server';
import { account, page } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const signedOut = {
  'GET auth/account': problem(401, 'notSignedIn'),
  'POST auth/refresh': problem(401, 'notSignedIn'),
  'GET demo': ok({ people: [], password: '' }),
  'GET traces': ok(page()),
  'GET trailers': ok(page()),
};

describe('signing in', () => {
  it('asks for it first and then opens what was wanted', async () => {
    const server = fakeServer({ ...signedOut, 'POST auth/sign-in': ok(account()) });
    const { user, where } = renderAt('/trailers');

    await user.type(await screen.findByLabelText('E-mail'), ' orla@yard.example ');
    await user.type(screen.getByLabelText('Password'), 'a long password');
    await user.type(screen.getByLabelText(/^Name of this device/), 'Bay 2 tablet');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));

    expect(await screen.findByRole('heading', { level: 1, name: 'Trailers' })).toBeVisible();
    expect(where()).toBe('/trailers');
    expect(server.sent('POST auth/sign-in')[0]?.body).toEqual({
      email: 'orla@yard.example',
      password: 'a long password',
      deviceName: 'Bay 2 tablet',
    });
  });

  it('says which field is empty, beside the field', async () => {
    fakeServer(signedOut);
    const { user } = renderAt('/sign-in');
    await user.click(await screen.findByRole('button', { name: 'Sign in' }));
    expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription('Type your e-mail.');
    expect(screen.getByLabelText('E-mail')).toBeInvalid();
  });

  it('keeps what was typed when the server says no', async () => {
    fakeServer({ ...signedOut, 'POST auth/sign-in': problem(401, 'signInFailed') });
    const { user } = renderAt('/sign-in');
    await user.type(await screen.findByLabelText('E-mail'), 'orla@yard.example');
    await user.type(screen.getByLabelText('Password'), 'wrong');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'The e-mail or the password is not right.',
    );
    expect(screen.getByLabelText('E-mail')).toHaveValue('orla@yard.example');
    expect(screen.getByLabelText('Password')).toHaveValue('wrong');
  });

  it('shows and hides the password', async () => {
    fakeServer(signedOut);
    const { user } = renderAt('/sign-in');
    await user.click(await screen.findByRole('button', { name: 'Show the password' }));
    expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'text');
  });

  it('offers the demo people where the server has them', async () => {
    const demo = {
      password: 'demo-password',
      people: [{ name: 'Maren Thistlewood', email: 'maren@yard.example', role: 'lead' }],
    };
    const server = fakeServer({
      ...signedOut,
      'GET demo': ok(demo),
      'POST auth/sign-in': ok(account('lead')),
    });
    const { user } = renderAt('/sign-in');
    await user.click(
      await screen.findByRole('button', { name: 'Sign in as Maren Thistlewood, Lead' }),
    );
    expect(await screen.findByRole('heading', { level: 1, name: 'Yard' })).toBeVisible();
    expect(server.sent('POST auth/sign-in')[0]?.body).toEqual({
      email: 'maren@yard.example',
      password: 'demo-password',
    });
  });
});
