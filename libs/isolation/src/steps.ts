/** Thrown inside a search that has used up its steps, and caught by whoever set the limit. */
class StepsSpent extends Error {}

/** How much a search may still do. Counted, not timed, so that the same question gives the same answer everywhere. */
export class Steps {
  constructor(public left: number) {}

  /** @throws StepsSpent when fewer were left. */
  spend(count: number): void {
    this.left -= count;
    if (this.left < 0) throw new StepsSpent();
  }
}

/** What a search comes to within its share of the steps, or `null`; what it does is taken from the whole. */
export function within<Found>(
  whole: Steps,
  share: number,
  search: (steps: Steps) => Found | null,
): Found | null {
  const granted = Math.max(0, Math.floor(Math.min(share, whole.left)));
  const steps = new Steps(granted);
  try {
    return search(steps);
  } catch (error) {
    if (error instanceof StepsSpent) return null;
    throw error;
  } finally {
    whole.left -= granted - Math.max(0, steps.left);
  }
}
