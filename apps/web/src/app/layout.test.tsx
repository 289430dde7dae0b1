import { screen, waitFor } from '@testing-library/react';
import { fakeServer, ok } from '../testing/fake-server';
import { account, page } from '../testing/fixtures';
import { renderAt } from '../testing/render-at';

const yard = {
  'GET auth/account': ok(account('lead')),
  'GET traces': ok(page()),
  'GET trailers': ok(page()),
  'GET plans': ok(page()),
  'GET people': ok(page()),
};

describe('the frame', () => {
  it('moves the focus to the heading of the next screen, and names the tab', async () => {
    fakeServer(yard);
    const { user } = renderAt('/');
    const first = await screen.findByRole('heading', { level: 1, name: 'Yard' });
    expect(first).not.toHaveFocus();
    await user.click(screen.getByRole('link', { name: 'Trailers' }));
    const next = await screen.findByRole('heading', { level: 1, name: 'Trailers' });
    await waitFor(() => expect(next).toHaveFocus());
    expect(document.title).toBe('Trailers · Lampwright');
    expect(screen.getByRole('link', { name: 'Trailers' })).toHaveAttribute('aria-current', 'page');
  });

  it('begins with a way past the menu', async () => {
    fakeServer(yard);
    const { user } = renderAt('/');
    await screen.findByRole('heading', { level: 1, name: 'Yard' });
    await user.tab();
    expect(screen.getByRole('link', { name: 'Skip to the content' })).toHaveFocus();
    expect(screen.getByRole('main')).toHaveAttribute('id', 'content');
  });

  it('says that an address leads nowhere, inside the frame', async () => {
    fakeServer(yard);
    renderAt('/no/such/place');
    expect(
      await screen.findByRole('heading', { name: 'There is nothing at this address' }),
    ).toBeVisible();
    expect(screen.getByRole('navigation', { name: 'Main menu' })).toBeVisible();
  });
});
