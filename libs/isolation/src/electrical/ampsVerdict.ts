import type { CircuitId, Harness, PartId } from '@lampwright/harness';
import { DEFAULT_AMMETER, trueAmps, type Ammeter, type AmpsRange } from './ammeter';
import { couldBeDark, darkFits, type DarkFit } from './darkFits';
import { expectedLoad, type AmpsBand, type LoadOptions } from './expectedLoad';

/** What an amps reading of a circuit that holds says. */
export type AmpsVerdict =
  /** More than any healthy lamps draw: a short that does not trip. */
  | { kind: 'above'; expected: AmpsBand; excess: AmpsRange }
  /** Less than all lamps draw. `fits`: what may be dark, the best fit first; none where only several together fit. */
  | { kind: 'below'; expected: AmpsBand; missing: AmpsRange; fits: DarkFit[] }
  /** As the lamps draw. `mayHide`: the loads whose being dark would not show. */
  | { kind: 'asExpected'; expected: AmpsBand; mayHide: PartId[] }
  /** As the lamps draw, but not even the greatest load's being dark would show. */
  | { kind: 'tooCoarse'; expected: AmpsBand };

export interface AmpsVerdictOptions extends LoadOptions {
  meter?: Ammeter;
}

/**
 * Compares a reading with what the energised loads draw. `open` are the points that were open. Whatever the bands and
 * the meter leave possible is kept, so it never claims more than they bear. O((parts + runs) log parts).
 *
 * @throws UnknownCircuitError
 * @throws RangeError as `solveCircuit` does.
 */
export function ampsVerdict(
  harness: Harness,
  circuit: CircuitId,
  open: readonly PartId[],
  reading: number,
  options: AmpsVerdictOptions = {},
): AmpsVerdict {
  const load = expectedLoad(harness, circuit, open, options);
  const { loads, ...expected } = load;
  const meter = options.meter ?? DEFAULT_AMMETER;
  const read = trueAmps(reading, meter);
  if (read.least > expected.most) {
    const excess = { least: read.least - expected.most, most: read.most - expected.least };
    return { kind: 'above', expected, excess };
  }
  if (read.most < expected.least) {
    const missing = { least: expected.least - read.most, most: expected.most - read.least };
    return {
      kind: 'below',
      expected,
      missing,
      fits: darkFits(harness, circuit, load, reading, meter),
    };
  }
  const mayHide = [...loads]
    .filter(([, one]) => couldBeDark(expected, one, read))
    .map(([id]) => id);
  const coarse = loads.size > 0 && mayHide.length === loads.size;
  return coarse ? { kind: 'tooCoarse', expected } : { kind: 'asExpected', expected, mayHide };
}
