import {
  circuitTree,
  energisedSections,
  placesOnCircuit,
  sectionTree,
  type Harness,
} from '@lampwright/harness';
import { arbitraryHarness } from '@lampwright/harness/testing';
import fc from 'fast-check';
import { sourceOf, usualOhmsPerMetre } from './feeding';
import { hotSiemens } from './loads';
import { locate } from './locate';
import { networkFrom } from './network';
import { portAt, sourceAmps } from './port';
import { solveTree } from './resistorTree';
import { solveCircuit } from './solveCircuit';
import { wiringOf } from './wiring';

/** To a billionth, or a femtoampere where the plan's loads are next to nothing. */
const close = (a: number, b: number) =>
  Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b), 1e-6);

const feeding = { sourceOhms: 0.05, returnOhms: 0.02, copperCelsius: 35 };

/** Any plan with one of its circuits, some points open, and two picks. */
const arbitraryCase = arbitraryHarness().chain((harness) =>
  fc.record({
    harness: fc.constant(harness),
    circuit: fc.constantFrom(...harness.circuits.map(({ id }) => id)),
    open: fc.subarray(harness.parts.filter((part) => part.separable).map(({ id }) => id)),
    pick: fc.nat(),
    fraction: fc.double({ min: 0, max: 1, noNaN: true }),
  }),
);

function placeOf(harness: Harness, circuit: string, pick: number) {
  const places = placesOnCircuit(harness, circuit);
  return places[pick % places.length]!.ref;
}

describe('any circuit of any plan', () => {
  it('gives the source what loads and shorts take, and each run what lies beyond it', () => {
    fc.assert(
      fc.property(arbitraryCase, ({ harness, circuit, open, pick, fraction }) => {
        const short = { place: placeOf(harness, circuit, pick), fraction, ohms: 0.3 };
        const solution = solveCircuit(harness, circuit, { ...feeding, open, shorts: [short] });
        const { amps, loadAmps, runAmps, shortAmps } = solution;
        const taken = [...loadAmps.values(), ...shortAmps].reduce((sum, value) => sum + value, 0);
        const inlet = circuitTree(harness, circuit).nodes[0]!;
        const leaving = inlet.runs.reduce((sum, { id }) => sum + runAmps.get(id)!, 0);
        const atInlet =
          (loadAmps.get(inlet.part.id) ?? 0) +
          (short.place.kind === 'part' && short.place.id === inlet.part.id ? shortAmps[0]! : 0);
        return close(taken, amps) && close(leaving + atInlet, amps);
      }),
    );
  });

  it('foretells the amps of a short at any place without solving again', () => {
    fc.assert(
      fc.property(arbitraryCase, ({ harness, circuit, open, pick, fraction }) => {
        const spot = { place: placeOf(harness, circuit, pick), fraction };
        const wiring = wiringOf(harness, circuit, new Set(open));
        const network = networkFrom(wiring, 0, {
          ohmsPerMetre: usualOhmsPerMetre(feeding.copperCelsius),
          siemens: hotSiemens(harness, circuit),
        });
        const solution = solveTree(network.tree, sourceOf(harness, feeding));
        const found = locate(wiring, network, spot);
        const shorts = [{ ...spot, ohms: 0.3 }];
        const solved = solveCircuit(harness, circuit, { ...feeding, open, shorts });
        if (!found) return solved.shortAmps[0] === 0;
        const port = portAt(network.tree, solution, found.node, found.share);
        return close(sourceAmps(solution, port, 0.3), solved.amps);
      }),
    );
  });

  it('powers exactly the parts that are energised', () => {
    fc.assert(
      fc.property(arbitraryCase, ({ harness, circuit, open }) => {
        const { volts } = solveCircuit(harness, circuit, { ...feeding, open });
        const tree = sectionTree(harness, circuit);
        const energised = energisedSections(tree, open);
        return tree.sections.every(({ index, places }) =>
          places.every(({ ref }) => {
            if (ref.kind === 'run' || ref.half === 'load') return true;
            return (volts.get(ref.id) ?? 0) > 0 === energised[index];
          }),
        );
      }),
    );
  });
});
