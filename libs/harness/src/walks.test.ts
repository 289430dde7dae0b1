import { circuitTree } from './circuitTree';
import { energisedParts, sectionOf } from './energised';
import { PartNotOnCircuitError, UnknownCircuitError } from './errors';
import { indexHarness } from './indexHarness';
import { expectedAmps } from './loads';
import { placesOnCircuit } from './placesOnCircuit';
import { sectionTree } from './sectionTree';
import { chain, CIRCUIT, goodPlan } from './testing';
import { downstream, lampsOnCircuit, partsOnCircuit, pathToInlet } from './walks';

const ids = (items: readonly { id: string }[]) => items.map(({ id }) => id);

describe('circuitTree', () => {
  it('goes feed first, each branch to its end', () => {
    expect(ids(partsOnCircuit(goodPlan, 'tail'))).toEqual(['nose', 'p1', 's1', 'l1', 'l2']);
    expect(ids(partsOnCircuit(goodPlan, 'stop'))).toEqual(['nose', 'p1', 's1', 'l1', 'm1']);
  });

  it('knows the run that feeds a part and the runs that go on', () => {
    const node = circuitTree(goodPlan, 'stop').nodeByPart.get('p1');
    expect(node?.feed?.id).toBe('w1');
    expect(ids(node?.runs ?? [])).toEqual(['w2', 'w5']);
  });

  it('makes a tree even of a plan with a loop', () => {
    const back = { id: 'w6', from: 's1', to: 'p1', circuits: ['tail'], metres: 1 };
    const tree = circuitTree({ ...goodPlan, runs: [...goodPlan.runs, back] }, 'tail');
    expect(ids(downstream(tree, 'p1'))).toEqual(['s1', 'l1', 'l2']);
  });

  it('is empty for a plan without an inlet', () => {
    expect(circuitTree({ ...goodPlan, parts: [] }, 'tail').nodes).toEqual([]);
  });

  it('refuses a circuit that is not there', () => {
    expect(() => circuitTree(goodPlan, 'turn')).toThrow(UnknownCircuitError);
  });
});

describe('walks', () => {
  const tail = circuitTree(goodPlan, 'tail');

  it('finds the lamps of a circuit', () => {
    expect(ids(lampsOnCircuit(goodPlan, 'tail'))).toEqual(['l1', 'l2']);
    expect(ids(lampsOnCircuit(goodPlan, 'stop'))).toEqual(['l1']);
  });

  it('finds what a part feeds', () => {
    expect(ids(downstream(tail, 's1'))).toEqual(['l1', 'l2']);
    expect(downstream(tail, 'l2')).toEqual([]);
  });

  it('finds the way back to the inlet', () => {
    const path = pathToInlet(tail, 'l2');
    expect(path.map(({ part }) => part.id)).toEqual(['l2', 's1', 'p1', 'nose']);
    expect(path.map(({ feed }) => feed?.id)).toEqual(['w4', 'w2', 'w1', undefined]);
  });

  it('refuses a part of another circuit', () => {
    expect(() => downstream(tail, 'm1')).toThrow(PartNotOnCircuitError);
    expect(() => pathToInlet(tail, 'toString')).toThrow(PartNotOnCircuitError);
  });

  it('goes 10,000 parts deep', () => {
    const deep = circuitTree(chain(10_000), CIRCUIT);
    expect(downstream(deep, 'inlet')).toHaveLength(10_001);
    expect(pathToInlet(deep, 'end')).toHaveLength(10_002);
  });
});

describe('indexHarness', () => {
  it('finds things by their ids and nothing else', () => {
    const { circuitById, partById, runById } = indexHarness(goodPlan);
    expect(partById.get('p1')?.label).toBe('Sill plug');
    expect(runById.get('w4')?.to).toBe('l2');
    expect(circuitById.get('stop')?.pin).toBe(4);
    expect(partById.get('constructor')).toBeUndefined();
  });
});

describe('expectedAmps', () => {
  it('adds up what is energised on the circuit', () => {
    const tree = sectionTree(goodPlan, 'tail');
    expect(expectedAmps(goodPlan, 'tail', energisedParts(tree, []))).toBeCloseTo(0.08, 12);
    expect(expectedAmps(goodPlan, 'tail', energisedParts(tree, ['l1']))).toBeCloseTo(0.04, 12);
    expect(expectedAmps(goodPlan, 'tail', energisedParts(tree, ['p1']))).toBe(0);
    expect(expectedAmps(goodPlan, 'stop', ['l1', 'l1', 'm1', 'nobody'])).toBeCloseTo(0.7, 12);
  });
});

describe('sectionOf', () => {
  const tree = sectionTree(goodPlan, 'tail');

  it('finds the halves of a plug on either side', () => {
    expect(sectionOf(tree, { kind: 'part', id: 'p1', half: 'feed' })).toBe(0);
    expect(sectionOf(tree, { kind: 'part', id: 'p1', half: 'load' })).toBe(1);
    expect(sectionOf(tree, { kind: 'part', id: 'p1' })).toBeUndefined();
  });

  it('finds half of a plug that cannot be opened with the whole', () => {
    const whole = sectionTree(goodPlan, 'tail', { notSeparable: new Set(['p1']) });
    expect(sectionOf(whole, { kind: 'part', id: 'p1', half: 'load' })).toBe(0);
    expect(sectionOf(whole, { kind: 'part', id: 'p1' })).toBe(0);
  });

  it('does not take a run for a part', () => {
    expect(sectionOf(tree, { kind: 'run', id: 'p1' })).toBeUndefined();
    expect(sectionOf(tree, { kind: 'run', id: 'w5' })).toBeUndefined();
  });
});

describe('placesOnCircuit', () => {
  it('lists parts, runs and both halves of a plug', () => {
    const refs = placesOnCircuit(goodPlan, 'stop').map(({ ref }) =>
      ref.kind === 'part' && ref.half ? `${ref.id} ${ref.half}` : ref.id,
    );
    expect(refs.toSorted()).toEqual(
      ['nose', 'w1', 'p1 feed', 'p1 load', 'w2', 's1', 'w3', 'l1', 'w5', 'm1'].toSorted(),
    );
  });
});
