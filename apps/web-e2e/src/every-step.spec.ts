import { expectAccessible, expectGloveSized, expectNoSidewaysScroll, useTheme } from './audit';
import { test } from './fixtures';
import { people, stateOf } from './people';
import { TraceWalk } from './trace-walk';
import { TruthfulTrailer } from './truthful-trailer';

test.use({ storageState: stateOf(people.technician) });

/** A walk that looks each new screen over before it touches anything on it. */
class AuditedWalk extends TraceWalk {
  private seen = '';

  override async tap(name: string | RegExp): Promise<void> {
    const title = (await this.title.textContent()) ?? '';
    // One power-up reads like another; the first of each kind is looked over.
    const kind = title.split(' ').slice(0, 2).join(' ');
    if (kind !== this.seen && this.page.url().includes('/traces/')) {
      this.seen = kind;
      await expectAccessible(this.page);
      await expectNoSidewaysScroll(this.page);
      if (!this.page.url().includes('/new')) await expectGloveSized(this.page);
    }
    await super.tap(name);
  }
}

for (const { theme, viewport } of [
  { theme: 'light', viewport: { width: 1180, height: 820 } },
  { theme: 'dark', viewport: { width: 390, height: 844 } },
] as const) {
  test.describe(`${theme}, ${viewport.width} wide`, () => {
    test.use({ viewport });

    test('every step is accessible and fit for gloves', async ({ page }) => {
      test.setTimeout(150_000);
      await useTheme(page, theme);
      const walk = new AuditedWalk(page, new TruthfulTrailer('U-016', 'tail', 's3'));
      await walk.toNarrow();
      await walk.narrow();
      await walk.fromInspect({ dark: ['Plate lamp'] });
      await expectAccessible(page);
    });
  });
}
