import type { Conductor, Harness } from '@lampwright/harness';
import { chain, CIRCUIT } from '@lampwright/harness/testing';
import fc from 'fast-check';
import { faultFacts } from './faultFacts';
import { trailer, CIRCUIT as TAIL } from './testing/trailer';

/** One run of a length, from the inlet to a lamp. */
function oneRun(feet: number, conductor: Conductor): Harness {
  const plan = chain(0);
  return { ...plan, runs: plan.runs.map((run) => ({ ...run, metres: feet * 0.3048, conductor })) };
}

describe('faultFacts', () => {
  it.each([
    // "About", worked out by hand from the solid-copper table: 12.6 V, 0.05 ohm of source, the frame not counted.
    [10, 14, 170],
    [53, 14, 70],
    [53, 12, 95],
    [53, 10, 120],
  ])('%d ft of %d AWG, dead short at the end: about %d A', (feet, awg, about) => {
    const short = { place: { kind: 'part', id: 'end' }, ohms: 0 } as const;
    const { amps } = faultFacts(oneRun(feet, { awg }), CIRCUIT, short, {
      volts: 12.6,
      sourceOhms: 0.05,
    });
    expect(Math.abs(amps - about)).toBeLessThan(5);
  });

  it('draws less the longer, the thinner and the poorer the way', () => {
    const lengths = fc.record({
      feet: fc.double({ min: 1, max: 60, noNaN: true }),
      more: fc.double({ min: 0.1, max: 20, noNaN: true }),
      awg: fc.integer({ min: 4, max: 20 }),
      ohms: fc.double({ min: 0, max: 2, noNaN: true }),
    });
    fc.assert(
      fc.property(lengths, ({ feet, more, awg, ohms }) => {
        const amps = (length: number, size: number, contact: number) =>
          faultFacts(
            oneRun(length, { awg: size }),
            CIRCUIT,
            { place: { kind: 'part', id: 'end' }, ohms: contact },
            { sourceOhms: 0.05 },
          ).amps;
        const here = amps(feet, awg, ohms);
        return (
          amps(feet + more, awg, ohms) < here &&
          amps(feet, awg + 1, ohms) < here &&
          amps(feet, awg, ohms + 0.1) < here
        );
      }),
    );
  });

  it('names the runs on the way and the one that stands it least', () => {
    const plan = trailer();
    const thin: Harness = {
      ...plan,
      runs: plan.runs.map((run) => (run.id === 'to-s2' ? { ...run, conductor: { awg: 18 } } : run)),
    };
    const short = { place: { kind: 'run', id: 'to-rear1' }, fraction: 0.5, ohms: 0.05 } as const;
    const facts = faultFacts(thin, TAIL, short, { sourceOhms: 0.05 });
    expect(facts.path.map(({ run }) => run)).toEqual([
      'to-p1',
      'to-s1',
      'to-p2',
      'to-s2',
      'to-rear1',
    ]);
    expect(facts.weakest).toBe('to-s2');
    expect(facts.volts.left).toBeCloseTo(facts.amps * 0.05, 9);
    expect(facts.volts.left + facts.volts.lost).toBeCloseTo(12, 9);
    // Each run carries at least the short's amps, the nearer the more: the lamps' come on top.
    const carried = facts.path.map(({ amps }) => Number(amps.toFixed(9)));
    expect(carried).toEqual([...carried].sort((a, b) => b - a));
    expect(carried.at(-1)).toBeGreaterThan(facts.amps);
    expect(facts.sourceAmps).toBeCloseTo(carried[0]!, 6);
  });

  it('finds nothing flowing where no power comes', () => {
    const short = { place: { kind: 'part', id: 's2' }, ohms: 0 } as const;
    const facts = faultFacts(trailer(), TAIL, short, { open: ['p2'] });
    expect(facts).toMatchObject({ amps: 0, path: [], weakest: null });
  });
});
