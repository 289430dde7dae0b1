import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

export const themes = ['light', 'dark'] as const;
export type Theme = (typeof themes)[number];

/** Chooses the theme as the account page does, before anything is painted. */
export async function useTheme(page: Page, theme: Theme): Promise<void> {
  await page.addInitScript((chosen) => localStorage.setItem('lampwright.theme', chosen), theme);
}

/** Nothing that axe knows of is wrong with the page as it stands. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const told = violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`,
  );
  expect(told, await page.title()).toEqual([]);
}

/** The page is no wider than its window: nobody has to scroll sideways. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const over = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(over, `${page.url()} is wider than its window by`).toBeLessThanOrEqual(0);
}

interface Box {
  name: string;
  /** What scrolls or stands still together; two of different layers may cover each other while scrolling. */
  layer: number;
  x: number;
  y: number;
  width: number;
  height: number;
}

const targets = 'button, a[href], input, textarea, select';

/** What a finger can touch in the panel of a step. */
async function boxes(page: Page): Promise<Box[]> {
  return page
    .getByRole('main')
    .locator(targets)
    .evaluateAll((elements) => {
      const layers: (Element | null)[] = [];
      const layerOf = (element: Element | null): number => {
        const { position, overflowY } = element ? getComputedStyle(element) : {};
        const own =
          !element || /sticky|fixed/.test(position ?? '') || /auto|scroll/.test(overflowY ?? '');
        if (!own) return layerOf(element.parentElement);
        if (!layers.includes(element)) layers.push(element);
        return layers.indexOf(element);
      };
      return elements
        .filter((element) => element.checkVisibility())
        .map((element) => {
          const { x, y, width, height } = element.getBoundingClientRect();
          const name = element.textContent || element.id;
          return { name, layer: layerOf(element), x, y, width, height };
        });
    });
}

const apart = (a: Box, b: Box) =>
  Math.max(
    Math.max(a.x, b.x) - Math.min(a.x + a.width, b.x + b.width),
    Math.max(a.y, b.y) - Math.min(a.y + a.height, b.y + b.height),
  );

/** Gloves: every target of a step is at least 56 px high, and 12 px from the next. */
export async function expectGloveSized(page: Page): Promise<void> {
  const all = await boxes(page);
  const small = all.filter(({ height, width }) => height < 55.5 || width < 55.5);
  expect(small, 'targets under 56 px').toEqual([]);
  const close = all.flatMap((a, index) =>
    all
      .slice(index + 1)
      .filter((b) => a.layer === b.layer && apart(a, b) < 11.5)
      .map((b) => `${a.name} ~ ${b.name}: ${apart(a, b).toFixed(1)} px`),
  );
  expect(close, 'targets nearer than 12 px').toEqual([]);
}
