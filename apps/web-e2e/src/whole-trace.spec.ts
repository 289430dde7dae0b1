import { expectAccessible, useTheme } from './audit';
import { AuditedWalk } from './audited-walk';
import { expect, test } from './fixtures';
import { people, stateOf } from './people';
import { TraceWalk } from './trace-walk';
import { TruthfulTrailer } from './truthful-trailer';

test.use({ storageState: stateOf(people.technician) });

const sizes = [
  { name: 'tablet', viewport: { width: 1180, height: 820 }, theme: 'light' },
  { name: 'phone', viewport: { width: 390, height: 844 }, theme: 'dark' },
] as const;

for (const { name, viewport, theme } of sizes) {
  test.describe(`on a ${name}`, () => {
    test.use({ viewport });

    test('a marker on a flatbed, with a reading taken back on the way', async ({ page }) => {
      const walk = new TraceWalk(
        page,
        new TruthfulTrailer('F-204', 'markers', 'front-marker-curb'),
      );
      await walk.toNarrow();
      const instruction = await walk.title.textContent();
      await walk.powerUp();
      await walk.tap(/^Undo/);
      await expect(walk.title).toHaveText(instruction ?? '');
      // The plugs are as they were: only the answer is given again.
      await walk.answer();
      await expect(walk.title).not.toHaveText(instruction ?? '');
      await walk.narrow();
      await walk.fromInspect();
    });

    test('a lamp on a van, with a point out of reach on the way', async ({ page }) => {
      const walk = new TraceWalk(page, new TruthfulTrailer('T-118', 'tail', 'id-centre'));
      await walk.toNarrow();
      const instruction = (await walk.title.textContent()) ?? '';
      await walk.tap('Can’t reach it');
      await expect(walk.title).toHaveText(/^(What is wrong with|Which point)/);
      if (/^Which point/.test((await walk.title.textContent()) ?? '')) {
        await walk.tap(new RegExp(instruction.replace('Unplug ', '').split(/, | and /)[0] ?? ''));
      }
      await walk.tap(/^Can’t reach it/);
      await expect(walk.title).toHaveText(/^Unplug/);
      await expect(walk.title).not.toHaveText(instruction);
      await walk.narrow();
      await walk.fromInspect({ dark: ['Plate lamp'] });
      await expect(page.getByText(/Plate lamp/).first()).toBeVisible();
    });

    test(`a splice, with the lid closed on the way; every step fit for gloves and accessible, ${theme}`, async ({
      page,
    }) => {
      test.setTimeout(180_000);
      await useTheme(page, theme);
      const walk = new AuditedWalk(page, new TruthfulTrailer('U-016', 'right', 'turn-splice-curb'));
      await walk.toNarrow();
      await walk.doAsTold();
      const instruction = await walk.title.textContent();
      await page.reload();
      await expect(walk.title).toHaveText(instruction ?? '');
      await walk.answer();
      await expect(walk.title).not.toHaveText(instruction ?? '');
      await walk.narrow();
      await page.reload();
      await expect(walk.title).toHaveText(/^Look at/);
      await walk.fromInspect({ dark: ['Plate lamp'] });
      await expectAccessible(page);
    });
  });
}
