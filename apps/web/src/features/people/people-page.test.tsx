import { screen, waitFor, within } from '@testing-library/react';
import { fakeServer, nothing, ok, problem } from '../../testing/fake-server';
import { account, page, person } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const session = {
  id: 's1',
  deviceName: 'Bay 2 tablet',
  createdAt: '2026-11-01T08:00:00.000Z',
  lastUsedAt: '2026-11-30T08:00:00.000Z',
  current: false,
};
const yard = {
  'GET auth/account': ok(account('lead', { id: 'p9' })),
  'GET people': ok(page(person())),
  'GET people/p1/sessions': ok([session]),
};

describe('people', () => {
  it('adds a person', async () => {
    const server = fakeServer({ ...yard, 'POST people': ok(person({ name: 'Ida Holt' })) });
    const { user } = renderAt('/people');
    await user.click(await screen.findByRole('button', { name: 'Add a person' }));
    const dialog = within(screen.getByRole('dialog', { name: 'Add a person' }));
    await user.type(dialog.getByLabelText('Name'), 'Ida Holt');
    await user.type(dialog.getByLabelText('E-mail'), 'ida@yard.example');
    await user.selectOptions(dialog.getByLabelText('Role'), 'trainee');
    await user.type(dialog.getByLabelText('First password'), 'a first password');
    await user.click(dialog.getByRole('button', { name: 'Add' }));
    expect(await screen.findByText('Ida Holt added')).toBeVisible();
    expect(server.sent('POST people')[0]?.body).toEqual({
      name: 'Ida Holt',
      email: 'ida@yard.example',
      role: 'trainee',
      password: 'a first password',
    });
  });

  it('never keeps a password on the device', async () => {
    fakeServer(yard);
    const { user, unmount } = renderAt('/people');
    await user.click(await screen.findByRole('button', { name: 'Add a person' }));
    await user.type(screen.getByLabelText('Name'), 'Ida');
    await user.type(screen.getByLabelText('First password'), 'a first password');
    unmount();
    const again = renderAt('/people');
    await again.user.click(await screen.findByRole('button', { name: 'Add a person' }));
    await waitFor(() => expect(screen.getByLabelText('Name')).toHaveValue('Ida'));
    expect(screen.getByLabelText('First password')).toHaveValue('');
  });

  it('changes a role, and says why the last lead stays', async () => {
    const server = fakeServer({ ...yard, 'PATCH people/p1': problem(409, 'lastLead') });
    const { user } = renderAt('/people');
    await user.click(await screen.findByRole('button', { name: 'Manage Orla Venn' }));
    await user.click(screen.getByRole('radio', { name: 'Trainee' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This is the last lead.');
    server.set('PATCH people/p1', ok(person({ role: 'trainee' })));
    await user.click(screen.getByRole('radio', { name: 'Trainee' }));
    await waitFor(() => expect(screen.getByRole('radio', { name: 'Trainee' })).toBeChecked());
    expect(server.sent('PATCH people/p1')[0]?.body).toEqual({ role: 'trainee' });
  });

  it('closes an account only after asking', async () => {
    const server = fakeServer({ ...yard, 'POST people/p1/close': ok(person({ closed: true })) });
    const { user } = renderAt('/people');
    await user.click(await screen.findByRole('button', { name: 'Manage Orla Venn' }));
    await user.click(screen.getByRole('button', { name: 'Close the account' }));
    const dialog = within(screen.getByRole('alertdialog'));
    expect(server.sent('POST people/p1/close')).toHaveLength(0);
    await user.click(dialog.getByRole('button', { name: 'Close the account' }));
    expect(await screen.findByRole('button', { name: 'Reopen the account' })).toBeVisible();
  });

  it('signs a device of a person out', async () => {
    const server = fakeServer({ ...yard, 'DELETE people/p1/sessions/s1': nothing });
    const { user } = renderAt('/people');
    await user.click(await screen.findByRole('button', { name: 'Manage Orla Venn' }));
    await user.click(await screen.findByRole('button', { name: 'Sign out Bay 2 tablet' }));
    expect(await screen.findByText('Bay 2 tablet is signed out')).toBeVisible();
    expect(server.sent('DELETE people/p1/sessions/s1')).toHaveLength(1);
  });

  it('is not for technicians', async () => {
    fakeServer({ ...yard, 'GET auth/account': ok(account('technician')) });
    renderAt('/people');
    expect(await screen.findByText('Your role does not allow this. Ask a lead.')).toBeVisible();
  });
});
