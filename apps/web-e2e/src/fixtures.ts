import { expect, test as base } from '@playwright/test';

/** A page on which nothing may go wrong unseen: no script error, no console error, no refusal by the content policy. */
export const test = base.extend<{ quiet: undefined }>({
  quiet: [
    async ({ page }, use) => {
      const complaints: string[] = [];
      page.on('pageerror', (error) => complaints.push(error.message));
      page.on('console', (message) => {
        // The browser itself reports a cut connection and a 401; tests that provoke them look at the screen.
        const expected = /ERR_INTERNET_DISCONNECTED|status of 401/.test(message.text());
        if (message.type() === 'error' && !expected) complaints.push(message.text());
      });
      await use(undefined);
      expect(complaints).toEqual([]);
    },
    { auto: true },
  ],
});

export { expect };
