import fc from 'fast-check';
import type { ResistorTree, Source } from '../resistorTree';

/** Amounts spread evenly over their order of magnitude. */
function spread(least: number, most: number): fc.Arbitrary<number> {
  return fc
    .double({ min: Math.log(least), max: Math.log(most), noNaN: true })
    .map((exponent) => Math.exp(exponent));
}

/** Trees of 1 to 25 nodes, from wires of milliohms and dead shorts to lamps and nothing at all. */
export const arbitraryTree: fc.Arbitrary<ResistorTree> = fc
  .array(
    fc.record({
      up: fc.nat(),
      ohms: spread(0.001, 10),
      siemens: fc.oneof(fc.constant(0), spread(0.001, 2), spread(10, 1000)),
    }),
    { minLength: 1, maxLength: 25 },
  )
  .map((nodes) => ({
    parent: nodes.map(({ up }, node) => (node === 0 ? -1 : up % node)),
    ohms: nodes.map(({ ohms }) => ohms),
    siemens: nodes.map(({ siemens }) => siemens),
  }));

export const arbitrarySource: fc.Arbitrary<Source> = fc.record({
  volts: spread(1, 30),
  ohms: spread(0.001, 5),
});
