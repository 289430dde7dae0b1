import { demoTraces, demoYard } from '@lampwright/demo';
import { expectAccessible, expectNoSidewaysScroll, themes, useTheme } from './audit';
import { expect, test } from './fixtures';
import { people, stateOf } from './people';

const sizes = [
  { width: 820, height: 1180 },
  { width: 390, height: 844 },
  { width: 1440, height: 900 },
  // The audit is held at the last: a tablet's.
  { width: 1180, height: 820 },
];

const [trailer] = demoYard.trailers;
const tank = demoYard.trailers.find(({ bodyType }) => bodyType === 'tank');
const [signed] = demoTraces();
const id = (thing: { id: string } | undefined) => {
  if (!thing) throw new Error('The demo yard lacks what this test opens.');
  return thing.id;
};

const screens: [name: string, path: string][] = [
  ['Yard', '/'],
  ['Traces', '/traces'],
  ['Traces, none that fit', '/traces?search=nothing-is-called-this'],
  ['Start a trace', '/traces/new'],
  ['A signed trace', `/traces/${id(signed)}`],
  ['Trailers', '/trailers'],
  ['A trailer', `/trailers/${id(trailer)}`],
  ['A tank trailer', `/trailers/${id(tank)}`],
  ['Add a trailer', '/trailers/new'],
  ['Plans', '/plans'],
  ['A plan', `/plans/${trailer?.planId ?? ''}`],
  ['Import a plan', '/plans/import'],
  ['People', '/people'],
  ['Account', '/account'],
  ['No such page', '/nowhere'],
];

test.describe('signed in as the lead', () => {
  test.use({ storageState: stateOf(people.lead) });

  test('every screen is accessible in both themes and fits its window', async ({ page }) => {
    test.setTimeout(240_000);
    for (const [name, path] of screens) {
      await test.step(name, async () => {
        await page.goto(path);
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
        await expect(page.locator('[aria-busy="true"]')).toHaveCount(0);
        for (const size of sizes) {
          await page.setViewportSize(size);
          await expectNoSidewaysScroll(page);
        }
        for (const theme of themes) {
          // The lead's account follows the device.
          await page.emulateMedia({ colorScheme: theme });
          await expect(page.locator('html')).toHaveClass(theme);
          await expectAccessible(page);
        }
      });
    }
  });
});

for (const theme of themes) {
  test(`the sign-in is accessible, ${theme}`, async ({ page }) => {
    await useTheme(page, theme);
    await page.goto('/');
    await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
    await expect(page.getByRole('button', { name: /^Sign in as/ })).toHaveCount(5);
    await expectAccessible(page);
  });
}
