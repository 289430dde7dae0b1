import { energisedSections } from '@lampwright/harness';
import { arbitraryQuestion } from '../testing/arbitraryQuestion';
import { treeOf } from '../testing/trees';
import { DEFAULT_TIMING } from '../timing';
import fc from 'fast-check';
import type { Hunt, HuntAdvice, HuntPlan, Reading } from '../types';
import { createHuntPlanner } from './createHuntPlanner';

const planner = createHuntPlanner({ steps: 300 });
const star = (leaves: number) => treeOf([-1, ...Array.from({ length: leaves }, () => 0)]);
const overload = (...open: string[]): Reading => ({ open, outcome: 'overload' });
const holds = (...open: string[]): Reading => ({ open, outcome: 'holds' });

function planOf(tree: Hunt['tree'], hunt: Partial<Hunt>): HuntPlan {
  const open = hunt.readings?.at(-1)?.open ?? [];
  return planner.plan({ tree, readings: [], options: {}, open, timing: DEFAULT_TIMING, ...hunt });
}

function adviceOn(tree: Hunt['tree'], hunt: Partial<Hunt>): HuntAdvice {
  const plan = planOf(tree, hunt);
  if (plan.kind !== 'powerUp') throw new Error(`no power-up but ${plan.kind}`);
  return plan.advice;
}

describe('a fault that comes and goes', () => {
  const two = star(1);
  const options = { detection: 0.7 };

  it('is read again, touching nothing, where one clean reading is not enough', () => {
    expect(adviceOn(two, { options, readings: [holds('p1')] })).toMatchObject({
      purpose: 'narrow',
      open: ['p1'],
      toOpen: [],
      toClose: [],
      repeats: true,
      stopsAt: 0.95,
      // The other half against 0.3 of this one.
      likeliest: { sections: [1], probability: 0.5 / (0.5 + 0.5 * 0.3) },
    });
  });

  it('is named once clean readings are enough', () => {
    // 1 / (1 + 0.3 ^ n) is 0.917 after two of them and 0.974 after three.
    const readings = [holds('p1'), holds('p1'), holds('p1')];
    expect(adviceOn(two, { options, readings: readings.slice(1) }).repeats).toBe(true);
    const plan = planOf(two, { options, readings });
    expect(plan).toMatchObject({ kind: 'found', sections: [1], stopsAt: 0.95 });
    expect(plan).toHaveProperty('confidence', expect.closeTo(1 / (1 + 0.3 ** 3), 12));
  });

  it('is named by one overload', () => {
    const plan = planOf(two, { options, readings: [overload('p1')] });
    expect(plan).toMatchObject({ kind: 'found', sections: [0], confidence: 1 });
  });

  it('is read no more often than the person asks to be sure', () => {
    const plan = planOf(two, { options, readings: [holds('p1')], confidence: 0.75 });
    expect(plan).toMatchObject({ kind: 'found', sections: [1], stopsAt: 0.75 });
  });
});

describe('several shorts', () => {
  const options = { maxFaults: 3 };
  const mended = [{ section: 1, after: 2 }];
  const before = [holds('p1', 'p2', 'p3'), overload('p2', 'p3')];

  it('are proven gone with everything closed', () => {
    const advice = adviceOn(star(3), { options, mended, readings: before });
    expect(advice).toMatchObject({ purpose: 'prove', open: [], toClose: ['p2', 'p3'] });
    expect(advice.overloadProbability).toBeGreaterThan(0);
    const plan = planOf(star(3), { options, mended, readings: [...before, holds()] });
    expect(plan).toMatchObject({ kind: 'clear', confidence: 1 });
  });

  it('are proven gone even where nothing is in question any more', () => {
    const readings = [holds('p1'), overload('p2', 'p3')];
    expect(adviceOn(star(3), { options, mended, readings })).toMatchObject({
      purpose: 'prove',
      overloadProbability: 0,
      bits: 0,
    });
  });

  it.each([
    // Clean power-ups in which a short that is there would have shown with 95 %: recomputed, ln 0.05 / ln(1 - d).
    { detection: 0.5, proofs: 5 },
    { detection: 0.7, proofs: 3 },
    { detection: 0.9, proofs: 2 },
    { detection: 0.95, proofs: 1 },
    { detection: 0.98, proofs: 1 },
  ])('are proven gone $proofs times where they show $detection of the time', (each) => {
    const kinds = Array.from({ length: each.proofs + 1 }, (_, times) => {
      const readings = [...before, ...Array.from({ length: times }, () => holds())];
      const detecting = { ...options, detection: each.detection };
      return planOf(star(3), { options: detecting, mended, readings }).kind;
    });
    expect(kinds).toEqual([...Array.from({ length: each.proofs }, () => 'powerUp'), 'clear']);
  });

  it('are hunted on with what is known: what held stays clear, what the mended one hid does not', () => {
    const { likeliest, open } = adviceOn(star(3), {
      options,
      mended,
      readings: [...before, overload()],
    });
    expect([2, 3]).toContain(likeliest.sections[0]);
    // One of the two is told from the other; the hub needs no asking.
    expect([['p2'], ['p3']]).toContainEqual(open);
  });

  it('are not cleared by an overload elsewhere', () => {
    const plan = planOf(star(3), { options, readings: [overload('p1'), overload('p1', 'p2')] });
    // p3 and the hub are left, and p1 and p2 may be short besides: they stay parted off.
    expect(plan.kind).toBe('powerUp');
    if (plan.kind !== 'powerUp') return;
    expect(plan.advice.energised).toEqual([0]);
  });

  it('of which none explains the readings are a contradiction', () => {
    const readings = [holds(), overload('p1')];
    expect(planOf(star(3), { options, readings })).toEqual({ kind: 'contradicted' });
  });
});

describe('a point that cannot be moved', () => {
  it('joins two sections, which are named together', () => {
    const plan = planOf(star(2), { barred: ['p1'], readings: [overload('p2')] });
    expect(plan).toMatchObject({ kind: 'found', sections: [0, 1] });
    expect(plan).toHaveProperty('confidence', expect.closeTo(1, 9));
  });

  it('is never moved', () => {
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 6 }),
        fc.constantFrom(1, 0.7),
        fc.constantFrom(1, 3),
        fc.array(fc.nat(), { minLength: 1, maxLength: 3 }),
        ({ tree, open, timing }, detection, maxFaults, picks) => {
          const ids = tree.sections.flatMap(({ point }) => (point ? [point.partId] : []));
          const barred = picks.map((pick) => ids[pick % ids.length] ?? '');
          const hunt = { tree, readings: [], options: { detection, maxFaults }, timing };
          const plan = planner.plan({ ...hunt, open, barred });
          if (plan.kind !== 'powerUp') return;
          const { toOpen, toClose } = plan.advice;
          for (const id of barred) expect([...toOpen, ...toClose]).not.toContain(id);
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe('any power-up of a hunt', () => {
  it('says what it energises, and can read either way', () => {
    fc.assert(
      fc.property(
        arbitraryQuestion({ points: 8 }),
        fc.constantFrom(1, 0.98, 0.7),
        fc.constantFrom(1, 2, 3),
        ({ tree, open, timing }, detection, maxFaults) => {
          const options = { detection, maxFaults };
          const plan = planner.plan({ tree, readings: [], options, open, timing });
          if (plan.kind !== 'powerUp') return;
          const { advice } = plan;
          const energised = energisedSections(tree, advice.open);
          expect(advice.energised).toEqual(energised.flatMap((on, at) => (on ? [at] : [])));
          expect(advice.overloadProbability).toBeGreaterThan(0);
          expect(advice.overloadProbability).toBeLessThan(1);
          expect(advice.bits).toBeGreaterThan(0);
          expect(advice.repeats).toBe(false);
        },
      ),
      { numRuns: 60 },
    );
  });
});
