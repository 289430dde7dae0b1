import { AWG_WIRES, METRIC_WIRES, type Conductor, type Sourced } from '@lampwright/harness';
import { AIRCRAFT_WIRES, AIRCRAFT_WIRES_SOURCE } from './aircraftWires';
import { awgDiameterMm, circleMm2, COPPER_OHM_METRES, perMetre } from './copper';

/** What a conductor reads at 20 °C, in ohm per metre one way: the bounds, and the figure to reckon with. */
export interface ConductorOhms extends Sourced {
  least: number;
  usual: number;
  most: number;
  /** Of the metal. */
  areaMm2: number;
}

/** Stands for a run whose conductor the plan does not say. Common practice, no source. */
export const ASSUMED_CONDUCTOR: Conductor = { awg: 14 };

const metricRows = METRIC_WIRES.filter(({ standard }) => standard === 'IEC 60228 class 5');

const FORMULA: Sourced = {
  source: 'Computed from the resistivity of annealed copper, 1.7241e-8 ohm metre, from memory',
  standing: 'memory',
};

/** The farthest that a row of the tables lies above plain copper of its nominal area; for sizes outside them. */
const WIDEST_METRIC = Math.max(
  ...metricRows.map(({ mm2, mostOhmsPerKm }) => mostOhmsPerKm / 1000 / plain(mm2)),
);
const WIDEST_AWG = Math.max(
  ...AWG_WIRES.map(({ awg, ohmsPerThousandFeet }) => {
    return (AIRCRAFT_WIRES.get(awg) ?? 0) / ohmsPerThousandFeet;
  }),
);

/**
 * Resistance of a conductor. An AWG size reckons with solid copper and may read as much as stranded, tin-plated wire; a
 * metric size reckons with the standard's ceiling and may read as little as copper of its nominal area. Sizes outside
 * the tables come from copper's resistivity and the cross-section.
 */
export function conductorOhms(conductor: Conductor = ASSUMED_CONDUCTOR): ConductorOhms {
  return 'awg' in conductor ? awgOhms(conductor.awg) : metricOhms(conductor.mm2);
}

function awgOhms(awg: number): ConductorOhms {
  const areaMm2 = circleMm2(awgDiameterMm(awg));
  const row = AWG_WIRES.find((wire) => wire.awg === awg);
  const usual = row ? perMetre(row.ohmsPerThousandFeet) : plain(areaMm2);
  const stranded = AIRCRAFT_WIRES.get(awg);
  const other = stranded === undefined ? usual * WIDEST_AWG : perMetre(stranded);
  const { source, standing } = row ?? FORMULA;
  return {
    least: Math.min(usual, other),
    usual,
    most: Math.max(usual, other),
    areaMm2,
    source: stranded === undefined ? source : `${source}; bounds: ${AIRCRAFT_WIRES_SOURCE.source}`,
    standing,
  };
}

function metricOhms(mm2: number): ConductorOhms {
  const row = metricRows.find((wire) => wire.mm2 === mm2);
  const least = plain(mm2);
  if (!row) return { least, usual: least, most: least * WIDEST_METRIC, areaMm2: mm2, ...FORMULA };
  const most = row.mostOhmsPerKm / 1000;
  const { source, standing } = row;
  return { least, usual: most, most, areaMm2: mm2, source, standing };
}

function plain(areaMm2: number): number {
  return COPPER_OHM_METRES / (areaMm2 * 1e-6);
}
