/** Thrown inside a search that has used up its steps, and caught by whoever set the limit. */
export class StepsSpent extends Error {}

/** How much a search may still do. Counted, not timed, so that the same question gives the same answer everywhere. */
export class Steps {
  constructor(private left: number) {}

  /** @throws StepsSpent when fewer were left. */
  spend(count: number): void {
    this.left -= count;
    if (this.left < 0) throw new StepsSpent();
  }
}

/** What a search comes to within its steps, or `null`. */
export function within<Found>(steps: number, search: (steps: Steps) => Found | null): Found | null {
  try {
    return search(new Steps(steps));
  } catch (error) {
    if (error instanceof StepsSpent) return null;
    throw error;
  }
}
