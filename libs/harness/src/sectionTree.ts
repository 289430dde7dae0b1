import { circuitTree, type CircuitNode } from './circuitTree';
import type { CircuitId, Harness, Part, PartId } from './harness';
import type { Place, PlaceRef, Section, SectionTree } from './sections';
import { partWeight, runWeight } from './weights';

export interface SectionOptions {
  /** Points that cannot be opened after all: each is treated as one whole place that nobody can separate. */
  notSeparable?: ReadonlySet<PartId>;
  /** Multiplies the weight of a place, finite and not negative: a shop's history, or damage that was seen. */
  factor?: (ref: PlaceRef) => number;
}

/**
 * Contracts one circuit into the sections that openings can tell apart: n separable points give n + 1 sections.
 *
 * - A separable plug parts everything beyond it. Half its weight stays on the feed side, half goes with the far side.
 * - A separable lamp or module takes away itself alone; its run stays, and so do runs that go on from it.
 * - All else belongs to the section it is wired to; the inlet is in section 0.
 *
 * Sections come in feed-first order. When every weight is 0 the sections count equally. O(parts + runs), without
 * recursion; never throws on a plan that the reader accepts.
 *
 * @throws UnknownCircuitError when the plan has no such circuit.
 */
export function sectionTree(
  harness: Harness,
  circuitId: CircuitId,
  options: SectionOptions = {},
): SectionTree {
  const builder = new SectionBuilder(options);
  for (const node of circuitTree(harness, circuitId).nodes) builder.add(node);
  return { circuit: circuitId, sections: builder.finish() };
}

/** Takes the nodes of a circuit feed first and sorts their places into sections. */
class SectionBuilder {
  private readonly sections: Section[] = [];
  /** The section that the runs going on from a part belong to. */
  private readonly onward = new Map<PartId, Section>();

  constructor(private readonly options: SectionOptions) {}

  add(node: CircuitNode): void {
    const { part, feed } = node;
    const feeding = feed && this.onward.get(feed.from);
    if (!feed || !feeding) {
      this.addWhole(part, this.open(null, null));
      return;
    }
    this.put(feeding, { kind: 'run', id: feed.id }, runWeight(feed));
    if (!part.separable || this.options.notSeparable?.has(part.id)) this.addWhole(part, feeding);
    else if (part.kind === 'plug') this.addPlug(part, feeding);
    else this.addEnd(part, feeding);
  }

  finish(): Section[] {
    share(this.sections);
    return this.sections;
  }

  private addWhole(part: Part, section: Section): void {
    this.onward.set(part.id, section);
    this.put(section, { kind: 'part', id: part.id }, partWeight(part));
  }

  private addPlug(part: Part, feeding: Section): void {
    const half = partWeight(part) / 2;
    this.put(feeding, { kind: 'part', id: part.id, half: 'feed' }, half);
    const beyond = this.open(feeding, part);
    this.onward.set(part.id, beyond);
    this.put(beyond, { kind: 'part', id: part.id, half: 'load' }, half);
  }

  private addEnd(part: Part, feeding: Section): void {
    this.onward.set(part.id, feeding);
    this.put(this.open(feeding, part), { kind: 'part', id: part.id }, partWeight(part));
  }

  private open(parent: Section | null, part: Part | null): Section {
    const section: Section = {
      index: this.sections.length,
      parent: parent?.index ?? null,
      point: part?.separable
        ? {
            partId: part.id,
            openSeconds: part.separable.openSeconds,
            closeSeconds: part.separable.closeSeconds,
            along: part.at.along,
          }
        : null,
      children: [],
      places: [],
      weight: 0,
      probability: 0,
    };
    this.sections.push(section);
    parent?.children.push(section.index);
    return section;
  }

  private put(section: Section, ref: PlaceRef, weight: number): void {
    const place: Place = { ref, weight: weight * (this.options.factor?.(ref) ?? 1) };
    section.places.push(place);
    section.weight += place.weight;
  }
}

/** Divides the weights by their sum; by way of the largest, so that enormous weights do not overflow. */
function share(sections: Section[]): void {
  let largest = 0;
  for (const { places } of sections) {
    for (const { weight } of places) largest = Math.max(largest, weight);
  }
  const portions = sections.map(({ places }) =>
    places.reduce((sum, { weight }) => sum + weight / largest, 0),
  );
  const whole = portions.reduce((sum, portion) => sum + portion, 0);
  for (const section of sections) {
    section.probability =
      largest > 0 ? (portions[section.index] ?? 0) / whole : 1 / sections.length;
  }
}
