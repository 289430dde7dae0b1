import { demoYard } from '@lampwright/demo';
import {
  energisedSections,
  sectionOf,
  sectionTree,
  type CircuitId,
  type Harness,
  type Part,
  type PartId,
} from '@lampwright/harness';

/** A trailer of the demo yard with a short in it: it knows what is unplugged and answers truthfully when powered. */
export class TruthfulTrailer {
  readonly harness: Harness;
  private readonly open = new Set<PartId>();

  constructor(
    readonly unit: string,
    readonly circuit: CircuitId,
    private readonly hidden: PartId,
  ) {
    const trailer = demoYard.trailers.find((one) => one.unit === unit);
    const plan = demoYard.plans.find(({ id }) => id === trailer?.planId);
    if (!plan) throw new Error(`The demo yard has no plan of ${unit}.`);
    this.harness = plan.harness;
  }

  /** Name of the circuit as the screens say it. */
  get circuitName(): string {
    return this.harness.circuits.find(({ id }) => id === this.circuit)?.name ?? this.circuit;
  }

  /** The part that holds the short. */
  get hiddenPart(): Part {
    return this.part((part) => part.id === this.hidden);
  }

  unplug(words: string): void {
    this.open.add(this.named(words).id);
  }

  plugIn(words: string): void {
    const { id } = this.named(words);
    if (!this.open.delete(id)) throw new Error(`${words} was not open.`);
  }

  get anythingOpen(): boolean {
    return this.open.size > 0;
  }

  /** Whether power on a circuit ends in an overload now. */
  overloads(circuit: CircuitId = this.circuit): boolean {
    if (circuit !== this.circuit || this.repaired) return false;
    const tree = sectionTree(this.harness, circuit);
    const section = sectionOf(tree, { kind: 'part', id: this.hidden });
    if (section === undefined) throw new Error('The hidden place is not on the circuit.');
    return energisedSections(tree, this.open)[section] ?? false;
  }

  repaired = false;

  /** The part whose label the words begin with; the longest label wins. */
  private named(words: string): Part {
    const fitting = this.harness.parts
      .filter(({ label }) => words.startsWith(label))
      .sort((a, b) => b.label.length - a.label.length);
    return this.part((part) => part === fitting[0], words);
  }

  private part(fits: (part: Part) => boolean, words = 'hidden part'): Part {
    const part = this.harness.parts.find(fits);
    if (!part) throw new Error(`No part fits "${words}".`);
    return part;
  }
}
