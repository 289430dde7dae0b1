import { screen, waitFor } from '@testing-library/react';
import { fakeServer, nothing, ok, problem } from '../../testing/fake-server';
import { account } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const session = {
  id: 's2',
  deviceName: 'Office laptop',
  createdAt: '2026-11-01T08:00:00.000Z',
  lastUsedAt: '2026-11-30T08:00:00.000Z',
  current: false,
};
const yard = {
  'GET auth/account': ok(account()),
  'GET auth/account/sessions': ok([
    session,
    { ...session, id: 's1', deviceName: 'Bay 2 tablet', current: true },
  ]),
};

describe('the account', () => {
  it('keeps a choice as soon as it is made, and shows it', async () => {
    const changed = account('technician', { preferences: { lengths: 'feet', theme: 'dark' } });
    const server = fakeServer({ ...yard, 'PATCH auth/account': ok(changed) });
    const { user } = renderAt('/account');
    await user.click(await screen.findByRole('radio', { name: /^Dark/ }));
    await waitFor(() => expect(document.documentElement).toHaveClass('dark'));
    expect(server.sent('PATCH auth/account')[0]?.body).toEqual({ preferences: { theme: 'dark' } });
    expect(screen.getByRole('radio', { name: /^Dark/ })).toBeChecked();
  });

  it('changes the password, or says that the current one is wrong', async () => {
    const errors = [{ path: 'current', code: 'wrongPassword', message: 'Wrong.' }];
    const server = fakeServer({
      ...yard,
      'POST auth/account/password': problem(400, 'validation', { errors }),
    });
    const { user } = renderAt('/account');
    await user.type(await screen.findByLabelText('Current password'), 'not this');
    await user.type(screen.getByLabelText('New password'), 'a longer password');
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    await waitFor(() =>
      expect(screen.getByLabelText('Current password')).toHaveAccessibleDescription(
        'This is not your current password.',
      ),
    );
    server.set('POST auth/account/password', nothing);
    await user.click(screen.getByRole('button', { name: 'Change the password' }));
    expect(await screen.findByText(/Your other devices are signed out/)).toBeVisible();
    expect(screen.getByLabelText('Current password')).toHaveValue('');
  });

  it('signs another device out, but not itself by mistake', async () => {
    const server = fakeServer({ ...yard, 'DELETE auth/account/sessions/s2': nothing });
    const { user } = renderAt('/account');
    await user.click(await screen.findByRole('button', { name: 'Sign out Office laptop' }));
    expect(await screen.findByText('Office laptop is signed out')).toBeVisible();
    expect(server.sent('DELETE auth/account/sessions/s2')).toHaveLength(1);
    expect(screen.queryByRole('button', { name: 'Sign out Bay 2 tablet' })).not.toBeInTheDocument();
  });
});
