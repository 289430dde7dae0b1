import { screen, waitFor } from '@testing-library/react';
import { fakeServer, ok } from '../../testing/fake-server';
import { account, page, trace } from '../../testing/fixtures';
import { renderAt } from '../../testing/render-at';

const signedIn = { 'GET auth/account': ok(account()) };

describe('the list of traces', () => {
  it('asks for what the address says', async () => {
    const server = fakeServer({ ...signedIn, 'GET traces': ok(page(trace())) });
    renderAt('/traces?state=open&circuit=black&sort=-powerUps&page=2');
    await screen.findByRole('table', { name: 'Traces' });
    const asked = server
      .sent('GET traces')
      .map(({ path }) => new URLSearchParams(path.split('?')[1]));
    const list = asked.find((params) => params.get('state') === 'open');
    expect(Object.fromEntries(list ?? [])).toEqual({
      state: 'open',
      circuit: 'black',
      sort: '-powerUps',
      page: '2',
      size: '25',
    });
    expect(screen.getByLabelText('State')).toHaveValue('open');
    expect(screen.getByLabelText('Circuit')).toHaveDisplayValue('Clearance and markers');
    expect(screen.getByRole('columnheader', { name: 'Power-ups' })).toHaveAttribute(
      'aria-sort',
      'descending',
    );
  });

  it('writes every choice into the address and starts at page 1 again', async () => {
    fakeServer({ ...signedIn, 'GET traces': ok(page(trace())) });
    const { user, where } = renderAt('/traces?page=3');
    await user.selectOptions(await screen.findByLabelText('State'), 'signed');
    expect(where()).toBe('/traces?state=signed');
    await user.click(await screen.findByRole('button', { name: 'Unit' }));
    expect(where()).toBe('/traces?state=signed&sort=trailer');
    await user.click(await screen.findByRole('button', { name: 'Unit' }));
    expect(where()).toBe('/traces?state=signed&sort=-trailer');
  });

  it('pages', async () => {
    fakeServer({ ...signedIn, 'GET traces': ok({ ...page(trace()), total: 60 }) });
    const { user, where } = renderAt('/traces');
    expect(await screen.findByText('1 to 25 of 60')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Next' }));
    expect(where()).toBe('/traces?page=2');
  });

  it('tells an empty yard from a filter that nothing passes', async () => {
    fakeServer({ ...signedIn, 'GET traces': ok(page()) });
    const { user, where } = renderAt('/traces?step=prove');
    expect(await screen.findByText('No trace matches')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Show all traces' }));
    await waitFor(() => expect(where()).toBe('/traces'));
    expect(await screen.findByText('No trace has been opened yet')).toBeVisible();
  });
});
