import { expect, type Locator, type Page } from '@playwright/test';
import type { CircuitId } from '@lampwright/harness';
import type { TruthfulTrailer } from './truthful-trailer';

/** Walks a trace as a person beside the trailer does: reads the screen, does what it says, answers what is seen. */
export class TraceWalk {
  constructor(
    readonly page: Page,
    readonly trailer: TruthfulTrailer,
  ) {}

  get title(): Locator {
    return this.page.getByRole('heading', { level: 1 });
  }

  /** Cards of the step that wait for a tick. A role query would take every plain button for one. */
  private get unticked(): Locator {
    return this.page.getByRole('main').locator('button[aria-pressed="false"]');
  }

  button(name: string | RegExp): Locator {
    return this.page.getByRole('button', { name });
  }

  /** Taps at the pace of a hand: the screens ignore a second tap in the same place within 400 ms. */
  async tap(name: string | RegExp): Promise<void> {
    await this.touch(this.button(name));
  }

  private async touch(target: Locator): Promise<void> {
    await target.tap();
    await this.page.waitForTimeout(410);
  }

  /** From the yard to the first instruction of the narrowing. */
  async toNarrow(): Promise<void> {
    await this.start();
    await this.sayWhatIsWrong();
    await this.makeSafe();
    await this.confirm();
    await expect(this.title).toHaveText(/^Unplug/);
  }

  /** From the known section to the signature; lamps of `dark`, by label, stay dark. */
  async fromInspect({ dark = [] }: { dark?: readonly string[] } = {}): Promise<void> {
    await this.inspect();
    await this.repair();
    await this.prove();
    await this.reconnect();
    await this.lampCheck(dark);
    await this.sign();
    await expect(this.page.getByText('All sent')).toBeVisible();
  }

  async start(): Promise<void> {
    await this.page.goto('/');
    await this.page.getByRole('link', { name: /^Start a trace/ }).tap();
    const unit = this.page.getByRole('radio', { name: new RegExp(`^${this.trailer.unit}`) });
    // The list may still grow under the finger while it loads; a person taps again.
    await expect(async () => {
      await unit.tap();
      await expect(unit).toBeChecked({ timeout: 1_000 });
    }).toPass();
    // A test that runs beside this one may have a trace open on the same unit.
    await this.tap(/^Start (on unit|another anyway)/);
    await expect(this.title).toHaveText('What is the complaint?');
  }

  async sayWhatIsWrong(words = 'Trips as soon as the markers are on.'): Promise<void> {
    await this.tap('The tester reports overload');
    await this.page.getByLabel('In the driver’s words (optional)').fill(words);
    await this.tap('Next');
    await expect(this.title).toHaveText('Which circuits misbehave?');
    await this.tap(new RegExp(`^${this.trailer.circuitName}`));
    await this.tap('Next');
    await expect(this.title).toHaveText('What feeds power?');
    await this.tap(/^Tester that reports overload/);
    await this.tap(/^Yes, at hand/);
    await this.tap('Start');
  }

  async makeSafe(): Promise<void> {
    await expect(this.title).toHaveText('Make it safe first');
    const cautions = this.unticked;
    while ((await cautions.count()) > 0) {
      const before = await cautions.count();
      await this.touch(cautions.first());
      await expect(cautions).toHaveCount(before - 1);
    }
    await this.tap('All safe, go on');
  }

  async confirm(): Promise<void> {
    await expect(this.title).toHaveText(/^Power .+ once$/);
    await this.answer();
    await this.tap(/^Go on: narrow down/);
  }

  /** Does what the instruction says, in its order, and answers what the trailer then shows. */
  async powerUp(): Promise<void> {
    await this.doAsTold();
    const before = await this.title.textContent();
    const count = await this.powerUpsSoFar();
    await this.answer();
    // The next instruction may read the same; the history has one entry more.
    await expect
      .poll(async () => [await this.title.textContent(), await this.powerUpsSoFar()])
      .not.toEqual([before, count]);
  }

  /** Follows the instructions until the program sends the person to look. */
  async narrow(): Promise<void> {
    await expect(this.title).toHaveText(/^(Unplug|Plug|Leave|Look at)/);
    for (let n = 0; n < 60 && !(await this.looking()); n += 1) await this.powerUp();
    await expect(this.title).toHaveText(/^Look at/);
  }

  async doAsTold(): Promise<void> {
    const order = this.page.getByRole('list', { name: 'In this order' }).getByRole('listitem');
    for (const words of await order.allTextContents()) {
      const [, verb, rest] = /^(Plug|Then unplug|Unplug) (.+)$/s.exec(words.trim()) ?? [];
      if (!verb || !rest) throw new Error(`No instruction: "${words}"`);
      if (verb === 'Plug') this.trailer.plugIn(rest);
      else this.trailer.unplug(rest);
    }
  }

  async looking(): Promise<boolean> {
    return /^Look at/.test((await this.title.textContent()) ?? '');
  }

  async answer(circuit?: CircuitId): Promise<void> {
    await this.tap(this.trailer.overloads(circuit) ? /^Overload/ : /^Power holds/);
  }

  /** Looks at one place after another until the one that holds the short. */
  async inspect(): Promise<void> {
    const hidden = `Look at ${this.trailer.hiddenPart.label}`;
    for (let n = 0; n < 60 && (await this.title.textContent()) !== hidden; n += 1) {
      const title = (await this.title.textContent()) ?? '';
      await this.tap('Clear, next place');
      await expect(this.title).not.toHaveText(title);
    }
    await expect(this.title).toHaveText(hidden);
    await this.tap('Found it here');
  }

  async repair(): Promise<void> {
    await expect(this.title).toHaveText('What was it, and what did you do?');
    await this.tap('Wire chafed through');
    await this.tap('Wire mended, sleeved and clamped');
    await this.tap('Repaired, prove it');
    this.trailer.repaired = true;
  }

  /** Closes what the screen lists, then proves that power holds. */
  async prove(): Promise<void> {
    await this.closeListed('Plug back in first');
    await expect(this.title).toHaveText(/^Prove it/);
    await this.answer();
  }

  async reconnect(): Promise<void> {
    await this.closeListed('Plug everything back in');
    expect(this.trailer.anythingOpen).toBe(false);
  }

  private async closeListed(title: string): Promise<void> {
    const listed = this.unticked;
    while (((await this.title.textContent()) ?? '') === title) {
      const before = await listed.count();
      const words = (await listed.first().textContent()) ?? '';
      this.trailer.plugIn(words);
      await this.touch(listed.first());
      await expect
        .poll(
          async () => (await this.title.textContent()) !== title || (await listed.count()) < before,
        )
        .toBe(true);
    }
  }

  /** Powers every circuit; all lamps are lit but those of `dark`, by label. */
  async lampCheck(dark: readonly string[] = []): Promise<void> {
    for (let n = 0; n < 20; n += 1) {
      await expect(this.title).toHaveText(
        /^(Power .+ with everything connected|Every circuit is checked)$/,
      );
      if ((await this.title.textContent()) === 'Every circuit is checked') break;
      await this.tap(/^Power holds/);
      await expect(this.title).toHaveText(
        /(Are all its lamps lit|with everything connected|Every circuit)/,
      );
      if (!/Are all its lamps lit/.test((await this.title.textContent()) ?? '')) continue;
      const before = await this.title.textContent();
      await this.markDark(dark);
      const rest = this.button(/^(All lit|The rest is lit|Next circuit)/);
      await this.touch(rest);
      await expect(this.title).not.toHaveText(before ?? '');
    }
    await this.tap('Lamp check done');
  }

  private async markDark(dark: readonly string[]): Promise<void> {
    if (dark.length === 0) return;
    await this.tap('Lamp by lamp');
    for (const label of dark) {
      const button = this.button(`${label}: Dark`);
      if ((await button.count()) > 0) await this.touch(button);
    }
  }

  async sign(): Promise<void> {
    await expect(this.title).toHaveText('Sign the trace');
    await this.tap('Sign and send to the lead');
    await expect(this.title).toHaveText(`Done: unit ${this.trailer.unit}`);
  }

  /** Power-ups in the history strip. */
  private async powerUpsSoFar(): Promise<number> {
    return this.page.getByRole('list', { name: 'Power-ups so far' }).getByRole('listitem').count();
  }
}
