import type { CircuitId, Harness } from '../harness';
import { readHarness } from '../reader/readHarness';
import exact01 from './cases/exact-01.json';
import exact02 from './cases/exact-02.json';
import exact03 from './cases/exact-03.json';
import exact04 from './cases/exact-04.json';
import exact05 from './cases/exact-05.json';
import exact06 from './cases/exact-06.json';
import exact07 from './cases/exact-07.json';
import exact08 from './cases/exact-08.json';
import exact09 from './cases/exact-09.json';
import exact10 from './cases/exact-10.json';
import exact11 from './cases/exact-11.json';
import exact12 from './cases/exact-12.json';
import large01 from './cases/large-01.json';
import large02 from './cases/large-02.json';
import large03 from './cases/large-03.json';

/** `walk`: the default times. `hand`: power at hand. `breaker`: power at hand, 40 s for each overload. */
export type CaseSetting = 'walk' | 'hand' | 'breaker';

/** Expected seconds for one short that always shows, over the default weights, all rounded to 0.001 s. */
export interface CaseExpectation {
  sections: number;
  /** The smallest possible, by exhaustive search; in the exact cases. */
  optimumSeconds?: number;
  /** A strong strategy's, not proven best; in the large cases. */
  referenceSeconds?: number;
  /** One point unplugged at a time, the quickest first; `null` where it was not computed. */
  easiestFirstSeconds: number | null;
  /** Halving the number of sections in question; `null` where it was not computed. */
  halfByCountSeconds: number | null;
  /** One point at a time, the most information a second. */
  greedySeconds: number;
  /** Entropy of the section that holds the short; in the large cases. */
  entropyBits?: number;
}

/** A plan with what is known about finding a short on one of its circuits. */
export interface PlanCase {
  name: string;
  harness: Harness;
  circuit: CircuitId;
  expected: Record<CaseSetting, CaseExpectation>;
}

interface CaseFile {
  harness: unknown;
  circuit: CircuitId;
  expected: Record<CaseSetting, CaseExpectation>;
}

/** Small plans whose optimum is known. */
export const exactCases: readonly PlanCase[] = [
  planCase('exact-01', exact01),
  planCase('exact-02', exact02),
  planCase('exact-03', exact03),
  planCase('exact-04', exact04),
  planCase('exact-05', exact05),
  planCase('exact-06', exact06),
  planCase('exact-07', exact07),
  planCase('exact-08', exact08),
  planCase('exact-09', exact09),
  planCase('exact-10', exact10),
  planCase('exact-11', exact11),
  planCase('exact-12', exact12),
];

/** Plans of the size of a trailer, with a reference to compare with. */
export const largeCases: readonly PlanCase[] = [
  planCase('large-01', large01),
  planCase('large-02', large02),
  planCase('large-03', large03),
];

function planCase(name: string, file: CaseFile): PlanCase {
  const reading = readHarness(file.harness);
  if (!reading.ok) throw new Error(`${name} is no valid plan: ${JSON.stringify(reading.faults)}`);
  return { name, harness: reading.harness, circuit: file.circuit, expected: file.expected };
}
