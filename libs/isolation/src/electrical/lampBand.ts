import { LAMP_CURRENTS, type LampTechnology, type Part, type Sourced } from '@lampwright/harness';

/** How far a lit lamp may lie from the amps that the plan gives it, as factors. */
export interface Band extends Sourced {
  least: number;
  most: number;
}

const led = LAMP_CURRENTS.filter(({ technology }) => technology === 'led');

/** The widest spread of the reference table's LED rows, for plans whose amps nobody read from a label. */
const LED_BAND: Band = {
  least: Math.min(...led.map(({ leastAmps, amps }) => (leastAmps && amps ? leastAmps / amps : 1))),
  most: Math.max(...led.map(({ mostAmps, amps }) => (mostAmps && amps ? mostAmps / amps : 1))),
  source: 'Widest spread of the LED rows of the lamp current table, from memory',
  standing: 'memory',
};

/** Bulbs of one number differ little; the supply, from a tired battery to a charging engine, differs more. */
const FILAMENT_BAND: Band = {
  least: 0.85,
  most: 1.15,
  source: 'Common practice, no source: bulb tolerance and supply voltage together',
  standing: 'memory',
};

export type LampBands = Readonly<Record<LampTechnology, Band>>;

/** What is taken where the plan's amps may be no more than defaults. */
export const LAMP_BANDS: LampBands = { led: LED_BAND, filament: FILAMENT_BAND };

/** The band of a part's load; a module is electronic, so it is taken as widely as an LED lamp. */
export function bandOf(part: Part, bands: LampBands = LAMP_BANDS): Band {
  return part.lamp?.technology === 'filament' ? bands.filament : bands.led;
}
