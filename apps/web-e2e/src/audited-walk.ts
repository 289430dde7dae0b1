import { expectAccessible, expectGloveSized, expectNoSidewaysScroll } from './audit';
import { TraceWalk } from './trace-walk';

/** A walk that looks each new screen over before it touches anything on it. */
export class AuditedWalk extends TraceWalk {
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
