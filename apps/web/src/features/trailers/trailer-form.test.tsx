import { screen, waitFor } from '@testing-library/react';
import { fakeServer, ok, problem } from '../../testing/fake-server';
import { account, page, plan, trailer } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const yard = {
  'GET auth/account': ok(account()),
  'GET trailers': ok(page()),
  'GET traces': ok(page()),
  'GET plans': ok(page(plan())),
  'GET plans/pl1': ok(plan()),
  'GET trailers/t1': ok(trailer()),
};

describe('the trailer form', () => {
  it('adds a trailer, with lengths in the unit of the person', async () => {
    const server = fakeServer({ ...yard, 'POST trailers': ok(trailer()) });
    const { user, where } = renderAt('/trailers/new');
    await user.type(await screen.findByLabelText('Unit'), 'T-118');
    await user.type(screen.getByLabelText('Fleet'), 'Quillmoor Freight');
    await user.type(screen.getByLabelText('Year'), '2019');
    await user.type(screen.getByLabelText('Length in feet'), '48');
    await user.type(screen.getByLabelText('Width in feet'), '8.5');
    await user.click(screen.getByRole('checkbox', { name: 'Lift gate' }));
    await user.click(screen.getByRole('button', { name: 'Add the trailer' }));
    await waitFor(() => expect(where()).toBe('/trailers/t1'));
    expect(server.sent('POST trailers')[0]?.body).toEqual({
      unit: 'T-118',
      bodyType: 'dryVan',
      lengthMetres: 14.63,
      widthMetres: 2.591,
      year: 2019,
      plate: null,
      fleet: 'Quillmoor Freight',
      notes: '',
      secondSources: ['liftGate'],
      abs: true,
      planId: null,
    });
  });

  it('does not send a length that cannot be, and says what can', async () => {
    const server = fakeServer(yard);
    const { user } = renderAt('/trailers/new');
    await user.type(await screen.findByLabelText('Length in feet'), '480');
    await user.click(screen.getByRole('button', { name: 'Add the trailer' }));
    await waitFor(() =>
      expect(screen.getByLabelText('Length in feet')).toHaveAccessibleDescription(
        /between 3 ft 3 in and 131 ft 3 in/,
      ),
    );
    expect(server.sent('POST trailers')).toHaveLength(0);
  });

  it('writes the words of the server beside the field and keeps the rest', async () => {
    const errors = [{ path: 'unit', code: 'unitTaken', message: 'Taken.' }];
    fakeServer({ ...yard, 'PATCH trailers/t1': problem(409, 'conflict', { errors }) });
    const { user } = renderAt('/trailers/t1/edit');
    const notes = await screen.findByLabelText(/^Notes/);
    await user.type(notes, 'Slider at the rear hole');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() =>
      expect(screen.getByLabelText('Unit')).toHaveAccessibleDescription(
        /Another trailer has this unit number/,
      ),
    );
    expect(notes).toHaveValue('Slider at the rear hole');
  });

  it('sends measures that were not touched as they came, with the version that was read', async () => {
    const server = fakeServer({ ...yard, 'PATCH trailers/t1': ok(trailer()) });
    const { user } = renderAt('/trailers/t1/edit');
    await user.type(await screen.findByLabelText(/^Plate/), 'QF 118');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(server.sent('PATCH trailers/t1')).toHaveLength(1));
    expect(server.sent('PATCH trailers/t1')[0]?.body).toMatchObject({
      lengthMetres: 14.63,
      widthMetres: 2.59,
      plate: 'QF 118',
      planId: 'pl1',
      version: 3,
    });
  });

  it('brings back what was typed after the lid was closed, until it is sent', async () => {
    fakeServer({ ...yard, 'POST trailers': problem(503, 'timeout') });
    const first = renderAt('/trailers/new');
    await first.user.type(await screen.findByLabelText('Unit'), 'N-5');
    await first.user.type(screen.getByLabelText('Fleet'), 'Saltmarsh');
    await first.user.click(screen.getByRole('checkbox', { name: 'Solar panel' }));
    first.unmount();

    const second = renderAt('/trailers/new');
    expect(await screen.findByText(/What you had typed is still here/)).toBeVisible();
    await waitFor(() => expect(screen.getByLabelText('Unit')).toHaveValue('N-5'));
    expect(screen.getByLabelText('Fleet')).toHaveValue('Saltmarsh');
    expect(screen.getByRole('checkbox', { name: 'Solar panel' })).toBeChecked();

    await second.user.click(screen.getByRole('button', { name: 'Start afresh' }));
    second.unmount();
    renderAt('/trailers/new');
    expect(await screen.findByLabelText('Unit')).toHaveValue('');
  });

  it('does not let a stale form overwrite another person, and loses no word', async () => {
    const errors = [{ path: 'version', code: 'staleVersion', message: 'Stale.' }];
    const server = fakeServer({
      ...yard,
      'PATCH trailers/t1': problem(409, 'conflict', { errors }),
    });
    const { user } = renderAt('/trailers/t1/edit');
    await user.type(await screen.findByLabelText(/^Plate/), 'QF 118');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    server.set('GET trailers/t1', ok(trailer({ fleet: 'Brackenloft', version: 4 })));
    await user.click(await screen.findByRole('button', { name: 'Fetch the newest version' }));
    expect(await screen.findByText(/What you had typed is still here/)).toBeVisible();
    await waitFor(() => expect(screen.getByLabelText(/^Plate/)).toHaveValue('QF 118'));
    expect(screen.getByLabelText('Fleet')).toHaveValue('Brackenloft');
    server.set('PATCH trailers/t1', ok(trailer({ version: 5 })));
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() =>
      expect(server.sent('PATCH trailers/t1').at(-1)?.body).toMatchObject({ version: 4 }),
    );
  });

  it('is not for trainees', async () => {
    fakeServer({ ...yard, 'GET auth/account': ok(account('trainee')) });
    renderAt('/trailers/new');
    expect(await screen.findByText('Your role may read trailers, not change them.')).toBeVisible();
  });
});
