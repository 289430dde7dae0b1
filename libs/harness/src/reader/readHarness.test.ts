import fc from 'fast-check';
import type { Harness } from '../harness';
import { placesOnCircuit } from '../placesOnCircuit';
import { arbitraryHarness, chain, star } from '../testing';
import { FAULT_LIMIT } from './faultList';
import { readHarness } from './readHarness';
import { readHarnessText } from './readHarnessText';

const json = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

describe('readHarness', () => {
  it('gives any valid plan back as it was', () => {
    fc.assert(
      fc.property(arbitraryHarness(), (harness) => {
        expect(readHarness(json(harness))).toEqual({ ok: true, harness: json(harness) });
      }),
    );
  });

  it('keeps keys that it does not know', () => {
    const plan = {
      ...chain(2),
      revision: 7,
      parts: chain(2).parts.map((part) => ({ ...part, colour: { code: 'x' } })),
    };
    expect(readHarness(plan)).toEqual({ ok: true, harness: plan });
  });

  it('refuses or reads a damaged plan, and never throws', () => {
    fc.assert(
      fc.property(damaged(), (document) => {
        const reading = readHarness(document);
        if (reading.ok) expectWired(reading.harness);
        else for (const fault of reading.faults) expect(fault.code).toEqual(expect.any(String));
      }),
      { numRuns: 300 },
    );
  });

  it('refuses or reads anything at all, and never throws', () => {
    fc.assert(
      fc.property(fc.anything({ withNullPrototype: true }), (value) => {
        const document = {
          format: 'lampwright-harness/1',
          circuits: value,
          parts: [value],
          runs: [value],
        };
        expect(readHarness(value).ok).toBe(false);
        expect(readHarness(document).ok).toBe(false);
      }),
    );
  });

  it.each([
    ['in a row', chain(10_000)],
    ['side by side', star(10_000)],
  ])('reads 10,000 parts %s', (_, plan) => {
    expect(readHarness(plan).ok).toBe(true);
  });

  it('reads a plan of 5 MB', () => {
    const plan = { ...star(10_000), notes: 'x'.repeat(3_500_000) };
    const text = JSON.stringify(plan);
    expect(text.length).toBeGreaterThan(5_000_000);
    expect(readHarnessText(text)).toEqual({ ok: true, harness: plan });
  });

  it('finds the way round a loop of 10,000 parts', () => {
    const plan = chain(9_999);
    plan.runs.push({ ...plan.runs[0]!, id: 'back', from: 'end', to: 'p1' });
    expect(readHarness(plan)).toMatchObject({
      ok: false,
      faults: [{ code: 'loop', id: 'back', found: 10_000 }],
    });
  });

  it('stops at the fault limit, and says that there is more', () => {
    const plan = { ...chain(1), parts: new Array(2_000_000).fill(1) };
    const reading = readHarness(plan);
    expect(reading).toMatchObject({ ok: false, more: true });
    expect(reading.ok ? [] : reading.faults).toHaveLength(FAULT_LIMIT);
  });

  it('keeps its faults short however long the texts of the document are', () => {
    const long = 'x'.repeat(100_000);
    const plan = chain(1);
    plan.runs[0]!.from = long;
    const reading = readHarness(plan);
    expect(JSON.stringify(reading).length).toBeLessThan(1_000);
  });

  it('is not fooled by a cycle of objects', () => {
    const plan: Harness & { self?: unknown } = chain(1);
    plan.self = plan;
    expect(readHarness(plan)).toMatchObject({ ok: false, faults: [{ code: 'tooDeep' }] });
  });
});

/** Every run is met on each of its circuits, so nothing of an accepted plan is out of the planner's sight. */
function expectWired(harness: Harness): void {
  for (const { id } of harness.circuits) {
    const runs = placesOnCircuit(harness, id).filter(({ ref }) => ref.kind === 'run');
    expect(runs).toHaveLength(harness.runs.filter((run) => run.circuits.includes(id)).length);
  }
}

/** A valid plan with some of its values, anywhere, taken out or replaced by something else from the plan or not. */
function damaged(): fc.Arbitrary<unknown> {
  const rubbish = fc.oneof(
    fc.constantFrom(undefined, null, NaN, Infinity, -1, 0, '', ' ', 'nowhere', true, [], {}, [[]]),
    fc.jsonValue(),
  );
  const blow = fc.record({ at: fc.nat(), put: fc.option(rubbish), twin: fc.nat() });
  return fc
    .tuple(arbitraryHarness({ maxParts: 6 }), fc.array(blow, { minLength: 1, maxLength: 4 }))
    .map(([harness, blows]) => {
      const document = json(harness);
      for (const { at, put, twin } of blows) {
        const slots = slotsOf(document);
        const slot = slots[at % slots.length]!;
        const other = slots[twin % slots.length]!;
        // A copy: the same object put in twice could come to hold itself.
        slot.owner[slot.key] = structuredClone(put === null ? other.owner[other.key] : put);
      }
      return document;
    });
}

interface Slot {
  owner: Record<string, unknown>;
  key: string;
}

/** Every place in a document where a value stands. */
function slotsOf(value: unknown): Slot[] {
  if (typeof value !== 'object' || value === null) return [];
  const owner = value as Record<string, unknown>;
  return Object.keys(owner).flatMap((key) => [{ owner, key }, ...slotsOf(owner[key])]);
}
