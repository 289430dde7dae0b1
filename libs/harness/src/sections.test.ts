import fc from 'fast-check';
import { energisedSections, sectionByPlace } from './energised';
import type { Harness, PartId } from './harness';
import { placeKey } from './placeKey';
import type { SectionTree } from './sections';
import { sectionTree } from './sectionTree';
import { arbitraryHarness, chain, CIRCUIT, exactCases, largeCases, star } from './testing';
import { partsOnCircuit } from './walks';

describe('sections of known plans', () => {
  it.each([...exactCases, ...largeCases])('$name', ({ harness, circuit, expected }) => {
    const { sections } = sectionTree(harness, circuit);
    for (const setting of Object.values(expected)) expect(sections).toHaveLength(setting.sections);
    expect(sum(sections.map(({ probability }) => probability))).toBeCloseTo(1, 12);
  });

  // The entropy was computed with the case by another program, from the same rules.
  it.each(largeCases)('$name has the known entropy', ({ harness, circuit, expected }) => {
    const { sections } = sectionTree(harness, circuit);
    const bits = sum(sections.map(({ probability: p }) => (p > 0 ? -p * Math.log2(p) : 0)));
    expect(bits).toBeCloseTo(expected.walk.entropyBits ?? NaN, 3);
  });
});

describe('sections of large plans', () => {
  it.each([
    ['10,000 plugs in a row', chain(10_000)],
    ['10,000 lamps side by side', star(10_000)],
  ])('%s', (_, harness) => {
    const tree = sectionTree(harness, CIRCUIT);
    expect(tree.sections).toHaveLength(10_001);
    expect(sum(tree.sections.map(({ probability }) => probability))).toBeCloseTo(1, 12);
    expect(energisedSections(tree, []).every(Boolean)).toBe(true);
  });
});

describe('sections of any plan', () => {
  const anyTree = arbitraryHarness().chain((harness) =>
    fc
      .constantFrom(...harness.circuits)
      .map(({ id }) => ({ harness, tree: sectionTree(harness, id) })),
  );

  it('hold every place once, with all its weight', () => {
    fc.assert(
      fc.property(anyTree, ({ harness, tree }) => {
        const places = tree.sections.flatMap((section) => section.places);
        expect(sectionByPlace(tree).size).toBe(places.length);
        expect(new Set(places.map(({ ref }) => `${ref.kind} ${ref.id}`))).toEqual(
          new Set([
            ...partsOnCircuit(harness, tree.circuit).map(({ id }) => `part ${id}`),
            ...runsOn(harness, tree.circuit).map(({ id }) => `run ${id}`),
          ]),
        );
      }),
    );
  });

  it('are one more than the points, and sum to 1', () => {
    fc.assert(
      fc.property(anyTree, ({ harness, tree }) => {
        const points = partsOnCircuit(harness, tree.circuit).filter((part) => part.separable);
        expect(tree.sections).toHaveLength(points.length + 1);
        expect(sum(tree.sections.map(({ probability }) => probability))).toBeCloseTo(1, 12);
      }),
    );
  });

  it('come parents first', () => {
    fc.assert(
      fc.property(anyTree, ({ tree }) => {
        for (const { index, parent, point, children } of tree.sections) {
          expect(parent === null).toBe(index === 0);
          expect(point === null).toBe(index === 0);
          expect(parent ?? -1).toBeLessThan(index);
          for (const child of children) expect(tree.sections[child]?.parent).toBe(index);
        }
      }),
    );
  });

  it('do not depend on what things are called', () => {
    fc.assert(
      fc.property(anyTree, ({ harness, tree }) => {
        expect(shapeOf(sectionTree(renamed(harness), `new ${tree.circuit}`))).toEqual(
          shapeOf(tree),
        );
      }),
    );
  });

  it('lose a boundary for each point that cannot be opened', () => {
    const anyBarred = anyTree.chain(({ harness, tree }) =>
      fc.subarray(pointsOf(tree)).map((barred) => ({ harness, tree, barred: new Set(barred) })),
    );
    fc.assert(
      fc.property(anyBarred, ({ harness, tree, barred }) => {
        const fewer = sectionTree(harness, tree.circuit, { notSeparable: barred });
        expect(new Set(pointsOf(fewer))).toEqual(
          new Set(pointsOf(tree).filter((point) => !barred.has(point))),
        );
        expect(sum(fewer.sections.map(({ weight }) => weight))).toBeCloseTo(
          sum(tree.sections.map(({ weight }) => weight)),
          6,
        );
      }),
    );
  });
});

describe('energisedSections of any plan', () => {
  it('is what wires still join to the inlet', () => {
    const anyOpening = arbitraryHarness().chain((harness) =>
      fc.record({
        harness: fc.constant(harness),
        circuit: fc.constantFrom(...harness.circuits.map(({ id }) => id)),
        open: fc.subarray(harness.parts.filter((part) => part.separable).map(({ id }) => id)),
      }),
    );
    fc.assert(
      fc.property(anyOpening, ({ harness, circuit, open }) => {
        const tree = sectionTree(harness, circuit);
        const energised = energisedSections(tree, open);
        const expected = joinedToInlet(harness, circuit, new Set(open));
        for (const section of tree.sections) {
          for (const { ref } of section.places) {
            expect([placeKey(ref), energised[section.index]]).toEqual([
              placeKey(ref),
              expected.has(placeKey(ref)),
            ]);
          }
        }
      }),
    );
  });
});

/** The same question answered without sections: follow the wires from the inlet, run by run. */
function joinedToInlet(harness: Harness, circuit: string, open: ReadonlySet<PartId>): Set<string> {
  const inlet = harness.parts.find((part) => part.kind === 'inlet')!;
  const joined = new Set([placeKey({ kind: 'part', id: inlet.id })]);
  const follow = (from: PartId): void => {
    for (const run of runsOn(harness, circuit).filter((candidate) => candidate.from === from)) {
      joined.add(placeKey({ kind: 'run', id: run.id }));
      const part = harness.parts.find(({ id }) => id === run.to)!;
      const ref = { kind: 'part' as const, id: part.id };
      const isOpen = open.has(part.id);
      if (part.kind === 'plug' && part.separable) {
        joined.add(placeKey({ ...ref, half: 'feed' }));
        if (isOpen) continue;
        joined.add(placeKey({ ...ref, half: 'load' }));
      } else if (!isOpen) joined.add(placeKey(ref));
      follow(part.id);
    }
  };
  follow(inlet.id);
  return joined;
}

function runsOn(harness: Harness, circuit: string) {
  return harness.runs.filter((run) => run.circuits.includes(circuit));
}

function renamed(harness: Harness): Harness {
  const name = (id: string) => `new ${id}`;
  const loads = <L extends { circuit: string }>(list: L[]) =>
    list.map((load) => ({ ...load, circuit: name(load.circuit) }));
  return {
    ...harness,
    circuits: harness.circuits.map((circuit) => ({ ...circuit, id: name(circuit.id) })),
    parts: harness.parts.map(({ lamp, module, ...part }) => ({
      ...part,
      id: name(part.id),
      ...(lamp && { lamp: { ...lamp, loads: loads(lamp.loads) } }),
      ...(module && { module: { loads: loads(module.loads) } }),
    })),
    runs: harness.runs.map((run) => ({
      ...run,
      id: name(run.id),
      from: name(run.from),
      to: name(run.to),
      circuits: run.circuits.map(name),
    })),
  };
}

function shapeOf(tree: SectionTree) {
  return tree.sections.map(({ index, parent, children, places, weight, probability }) => ({
    index,
    parent,
    children,
    weights: places.map((place) => place.weight),
    weight,
    probability,
  }));
}

function pointsOf(tree: SectionTree): PartId[] {
  return tree.sections.flatMap(({ point }) => (point ? [point.partId] : []));
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, number) => total + number, 0);
}
