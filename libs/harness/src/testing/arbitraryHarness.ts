import fc from 'fast-check';
import { appendTo } from '../appendTo';
import { HARNESS_FORMAT, type Circuit, type Harness, type Part, type Run } from '../harness';

export interface ArbitraryHarnessOptions {
  /** Parts besides the inlet. Default 12. */
  maxParts?: number;
  /** Default 4. */
  maxCircuits?: number;
}

const amount = fc.double({ min: 0, max: 500, noNaN: true });
const weight = fc.option(amount, { nil: undefined });

/** Any text that is not blank, and with preference those that trip a careless reader. */
const id = fc.oneof(
  fc.constantFrom(
    '__proto__',
    'constructor',
    'toString',
    'length',
    'p1:feed',
    'part:p1',
    '%3A',
    '0',
  ),
  fc.string({ minLength: 1, maxLength: 8 }).filter((text) => text.trim() !== ''),
);

/** What is chosen at random about one part; its place in the trees follows from `feeds`. */
const partChoice = fc.record({
  kind: fc.constantFrom('plug', 'splice', 'lamp', 'module'),
  separable: fc.option(fc.record({ openSeconds: amount, closeSeconds: amount }), {
    nil: undefined,
  }),
  along: fc.double({ min: -2, max: 20, noNaN: true }),
  across: fc.double({ min: -1.3, max: 1.3, noNaN: true }),
  faultWeight: weight,
  technology: fc.constantFrom('led', 'filament'),
  amps: amount,
  metres: amount,
  runWeight: weight,
  /** Whether parallel wires to the same part share one run. */
  bundled: fc.boolean(),
  /** By circuit: which of the parts before it feeds this one, or none. */
  feeds: fc.array(fc.option(fc.nat()), { minLength: 8, maxLength: 8 }),
});

type PartChoice = typeof partChoice extends fc.Arbitrary<infer Choice> ? Choice : never;

/**
 * Valid plans at random: several circuits, each its own tree over shared parts, with parts and runs in any order, odd
 * ids, and weights and times that may be 0.
 */
export function arbitraryHarness(options: ArbitraryHarnessOptions = {}): fc.Arbitrary<Harness> {
  const { maxParts = 12, maxCircuits = 4 } = options;
  return fc
    .record({
      choices: fc.array(partChoice, { maxLength: maxParts }),
      circuitIds: fc.uniqueArray(id, { minLength: 1, maxLength: Math.min(maxCircuits, 8) }),
      partIds: fc.uniqueArray(id, { minLength: maxParts + 1, maxLength: maxParts + 1 }),
      volts: fc.constantFrom(12, 24),
    })
    .map(({ choices, circuitIds, partIds, volts }) => build(choices, circuitIds, partIds, volts))
    .chain((harness) =>
      fc
        .record({ parts: shuffled(harness.parts), runs: shuffled(harness.runs) })
        .map((order) => ({ ...harness, ...order })),
    );
}

function shuffled<Item>(items: Item[]): fc.Arbitrary<Item[]> {
  return fc.shuffledSubarray(items, { minLength: items.length });
}

function build(
  choices: readonly PartChoice[],
  circuitIds: readonly string[],
  partIds: readonly string[],
  volts: 12 | 24,
): Harness {
  const inletId = partIds[0] ?? 'inlet';
  const inlet: Part = { id: inletId, kind: 'inlet', label: 'Inlet', at: { along: 0, across: 0 } };
  const circuits = circuitIds.map((circuit): Circuit => ({
    id: circuit,
    name: `Circuit ${circuit}`,
  }));
  const onCircuit = new Map(circuitIds.map((circuit) => [circuit, [inletId]]));
  const parts = [inlet];
  const runs: Run[] = [];
  for (const [index, choice] of choices.entries()) {
    const partId = partIds[index + 1] ?? `part ${index}`;
    const feeders = feedersOf(choice, onCircuit);
    parts.push(partOf(partId, choice, [...feeders.keys()]));
    for (const [from, carried] of bundles(feeders, choice.bundled)) {
      runs.push(runOf(`w${runs.length + 1}`, from, partId, carried, choice));
    }
    for (const circuit of feeders.keys()) onCircuit.get(circuit)?.push(partId);
  }
  const supply = { volts, connector: volts === 12 ? 'SAE J560' : 'ISO 12098' };
  return { format: HARNESS_FORMAT, name: 'Any plan', supply, circuits, parts, runs };
}

/** The part that feeds this one, circuit by circuit; at least the first circuit does. */
function feedersOf(
  choice: PartChoice,
  onCircuit: ReadonlyMap<string, readonly string[]>,
): Map<string, string> {
  const feeders = new Map<string, string>();
  for (const [index, [circuit, parts]] of [...onCircuit].entries()) {
    const pick = choice.feeds[index] ?? (index === 0 ? 0 : null);
    const feeder = pick === null ? undefined : parts[pick % parts.length];
    if (feeder !== undefined) feeders.set(circuit, feeder);
  }
  return feeders;
}

/** The runs to draw, each by the part it comes from and the circuits it carries. */
function bundles(feeders: ReadonlyMap<string, string>, bundled: boolean): [string, string[]][] {
  if (!bundled) return [...feeders].map(([circuit, from]) => [from, [circuit]]);
  const byFeeder = new Map<string, string[]>();
  for (const [circuit, from] of feeders) appendTo(byFeeder, from, circuit);
  return [...byFeeder];
}

function partOf(partId: string, choice: PartChoice, circuits: readonly string[]): Part {
  const { kind, along, across, separable, faultWeight, technology, amps } = choice;
  const loads = circuits.map((circuit) => ({ circuit, amps }));
  return {
    id: partId,
    kind,
    label: `A ${kind}`,
    at: { along, across },
    ...(separable && kind !== 'splice' && { separable }),
    ...(faultWeight !== undefined && { faultWeight }),
    ...(kind === 'lamp' && { lamp: { loads, technology } }),
    ...(kind === 'module' && { module: { loads: loads.slice(1) } }),
  };
}

function runOf(
  runId: string,
  from: string,
  to: string,
  circuits: string[],
  { metres, runWeight }: PartChoice,
): Run {
  const faultWeight = runWeight === undefined ? {} : { faultWeight: runWeight };
  return { id: runId, from, to, circuits, metres, ...faultWeight };
}
