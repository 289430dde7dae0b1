import { AWG_WIRES } from '@lampwright/harness';
import fc from 'fast-check';
import { ASSUMED_CONDUCTOR, conductorOhms } from './conductors';
import { awgDiameterMm, circleMm2, COPPER_CONSTANT, COPPER_OHM_METRES, ohmsAt } from './copper';

describe('conductorOhms', () => {
  it.each(AWG_WIRES)('has $awg AWG from the table, and the formula gives it back', (wire) => {
    const { usual, standing } = conductorOhms({ awg: wire.awg });
    expect(usual * 1000).toBeCloseTo(wire.ohmsPerKm, 1);
    expect(standing).toBe('read');
    const computed = COPPER_OHM_METRES / (circleMm2(awgDiameterMm(wire.awg)) * 1e-6);
    expect(Math.abs(computed / usual - 1)).toBeLessThan(0.0003);
  });

  it('computes other sizes, and says so', () => {
    const odd = conductorOhms({ awg: 13 });
    expect(odd.standing).toBe('memory');
    expect(odd.usual).toBeGreaterThan(conductorOhms({ awg: 12 }).usual);
    expect(odd.usual).toBeLessThan(conductorOhms({ awg: 14 }).usual);
    // Twice the metal, half the ohms.
    expect(conductorOhms({ mm2: 7 }).usual).toBeCloseTo(conductorOhms({ mm2: 14 }).usual * 2, 12);
  });

  it('bounds the usual figure, and thinner wire never reads less', () => {
    const awg = fc.integer({ min: 0, max: 24 });
    fc.assert(
      fc.property(awg, (size) => {
        const [thick, thin] = [conductorOhms({ awg: size }), conductorOhms({ awg: size + 1 })];
        return (
          thick.least <= thick.usual &&
          thick.usual <= thick.most &&
          thick.usual < thin.usual &&
          thick.areaMm2 > thin.areaMm2
        );
      }),
    );
  });

  it('assumes 14 AWG where the plan does not say', () => {
    expect(ASSUMED_CONDUCTOR).toEqual({ awg: 14 });
    expect(conductorOhms()).toEqual(conductorOhms({ awg: 14 }));
  });
});

describe('ohmsAt', () => {
  it('gives 15.7 % more at 60 °C and as much less at -20 °C', () => {
    // Recomputed; the coefficient is from memory, its agreement with the circular's 234.5 is checked here.
    expect(ohmsAt(1, 60)).toBeCloseTo(1.157, 3);
    expect(ohmsAt(1, -20)).toBeCloseTo(0.843, 3);
    expect(ohmsAt(1, 21) - 1).toBeCloseTo(1 / (COPPER_CONSTANT + 20), 5);
  });
});
