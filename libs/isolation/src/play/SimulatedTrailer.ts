import { energisedSections, type PartId, type SectionTree } from '@lampwright/harness';
import type { Outcome } from '../types';

/** One circuit with shorts hidden in it. It answers power-ups as a real one would; chance is handed in. */
export class SimulatedTrailer {
  private readonly short: Set<number>;

  /** `detection`: the probability that a power-up with a short energised shows it. `random`: numbers from 0 up to 1. */
  constructor(
    private readonly tree: SectionTree,
    shorts: Iterable<number>,
    private readonly detection: number,
    private readonly random: () => number,
  ) {
    this.short = new Set(shorts);
  }

  /** What one power-up shows with these points open. O(sections). */
  powerUp(open: readonly PartId[]): Outcome {
    const energised = energisedSections(this.tree, open);
    const lit = [...this.short].some((section) => energised[section]);
    return lit && this.random() < this.detection ? 'overload' : 'holds';
  }

  isShort(section: number): boolean {
    return this.short.has(section);
  }

  mend(section: number): void {
    this.short.delete(section);
  }

  /** Sections that are still short. */
  left(): number[] {
    return [...this.short];
  }
}
