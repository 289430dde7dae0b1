import { sectionTree } from '@lampwright/harness';
import { CONTACT_OF_OVERLOAD as contact } from './contact';
import { locate } from './locate';
import { shortedOhms } from './meterReadings';
import { meterView } from './meterView';
import { trueOhms } from './ohmmeter';
import { ohmsLikelihood } from './ohmsLikelihood';
import { CIRCUIT, trailer } from './testing/trailer';

const steps = 20_000;
/** Even over log(1 + ohms / hard), as contacts are believed to be. */
const contactGrid = Array.from({ length: steps }, (_, step) => {
  return (
    contact.hard * Math.expm1(((step + 0.5) / steps) * Math.log1p(contact.most / contact.hard))
  );
});

describe('ohmsLikelihood', () => {
  const harness = trailer();
  const tree = sectionTree(harness, CIRCUIT);
  const view = meterView({ harness, circuit: CIRCUIT, point: 'p1', side: 'load' });

  it.each([0.25, 0.3, 0.4])('weighs the lamps by the contacts that give %d ohm', (reading) => {
    const read = trueOhms(reading, { resolution: 0.01, tolerance: 0.01, leadOhms: 0.1 });
    const likelihood = ohmsLikelihood(view, tree, read, { contact, misread: 0 });
    const share = (id: string) => {
      const at = locate(view.wiring, view.usual.network, { place: { kind: 'part', id } })!;
      const hits = ([view.least, view.usual, view.usual, view.most] as const).map(
        (assumed) =>
          contactGrid.filter((ohms) => {
            const seen = shortedOhms(assumed, at, ohms);
            return read.least <= seen && seen <= read.most;
          }).length,
      );
      return hits.reduce((sum, count) => sum + count, 0) / (4 * steps);
    };
    const of = (id: string) =>
      likelihood[tree.sections.find(({ point }) => point?.partId === id)!.index]!;
    expect(share('front1')).toBeGreaterThan(0);
    expect(
      Math.abs(of('rear1') / of('front1') / (share('rear1') / share('front1')) - 1),
    ).toBeLessThan(0.02);
  });

  it('cannot see the other side of the point', () => {
    const read = trueOhms(0.4, { resolution: 0.1, tolerance: 0.01, leadOhms: 0.2 });
    const [near] = ohmsLikelihood(view, tree, read, { contact, misread: 0 });
    // The lamps alone read half an ohm and more, never 0.25.
    expect(near).toBe(0);
  });
});
