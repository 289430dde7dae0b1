import { BULBS } from './bulbs';
import { CABLES } from './cables';
import { CONNECTORS, connectorByName } from './connectors';
import { DIN_72552 } from './din72552';
import { LAMP_CURRENTS } from './lampCurrents';
import type { Sourced } from './sourced';
import { AWG_WIRES, METRIC_WIRES } from './wires';

const rows: [string, readonly Sourced[]][] = [
  ...CONNECTORS.map(({ name, contacts, keptApart }): [string, Sourced[]] => [
    name,
    [...contacts, ...keptApart, ...contacts.flatMap(({ size }) => size ?? [])],
  ]),
  ['cables', CABLES],
  ['terminals', DIN_72552],
  ['AWG wires', AWG_WIRES],
  ['metric wires', METRIC_WIRES],
  ['bulbs', BULBS],
  ['lamp currents', LAMP_CURRENTS],
];

describe('reference data', () => {
  it.each(rows)('%s: each row has a source and says how far it goes', (_, table) => {
    expect(table.length).toBeGreaterThan(0);
    for (const { source, standing } of table) {
      expect(source.trim()).not.toBe('');
      expect(standing === 'memory').toBe(/from memory/i.test(source));
    }
  });
});

describe('connectors', () => {
  it.each(CONNECTORS)('$name numbers each contact once, and only contacts it has', (connector) => {
    const pins = connector.contacts.map(({ pin }) => pin);
    expect(new Set(pins).size).toBe(pins.length);
    for (const { groundFor = [] } of connector.contacts) {
      expect(pins).toEqual(expect.arrayContaining([...groundFor]));
    }
    for (const apart of connector.keptApart) {
      expect(pins).toEqual(expect.arrayContaining([...apart.pins]));
    }
  });

  it.each(CONNECTORS)('$name gives each colour to one contact', ({ contacts }) => {
    const colours = contacts.flatMap(({ colour }) => colour ?? []);
    expect(new Set(colours).size).toBe(colours.length);
  });

  it.each(CONNECTORS)('$name labels contacts as DIN 72552 does', ({ contacts }) => {
    const labels = DIN_72552.map(({ label }) => label);
    for (const { label } of contacts) if (label) expect(labels).toContain(label);
  });

  it('are found by what people write', () => {
    expect(connectorByName('SAE J560')?.volts).toBe(12);
    expect(connectorByName('sae-j560')?.name).toBe('SAE J560');
    expect(connectorByName('12n')?.name).toBe('ISO 1724');
    expect(connectorByName('ISO 12098')?.contacts).toHaveLength(15);
    expect(connectorByName('ISO 11446')?.contacts).toHaveLength(13);
    expect(connectorByName('constructor')).toBeUndefined();
  });

  it('leave out the 24S, whose contacts are not known well enough', () => {
    expect(connectorByName('ISO 3731')).toBeUndefined();
    expect(connectorByName('24S')).toBeUndefined();
  });

  it('have names and aliases of their own', () => {
    const names = CONNECTORS.flatMap(({ name, aliases }) => [name, ...aliases]);
    expect(new Set(names).size).toBe(names.length);
  });
});

describe('cables', () => {
  it.each(CABLES)('$name has seven conductors', ({ conductors }) => {
    expect(conductors.reduce((sum, { count }) => sum + count, 0)).toBe(7);
  });

  it('SAE J2394 has the sizes that the J560 contacts are given', () => {
    const sizes = connectorByName('SAE J560')!.contacts.map(({ size }) =>
      size && 'awg' in size ? size.awg : undefined,
    );
    const { conductors } = CABLES.find(({ name }) => name === 'SAE J2394')!;
    for (const { awg, count } of conductors) {
      expect(sizes.filter((size) => size === awg)).toHaveLength(count);
    }
  });
});

describe('wires', () => {
  it.each(AWG_WIRES)('AWG $awg agrees with the AWG rule and its own columns', (wire) => {
    const diameter = 0.127 * 92 ** ((36 - wire.awg) / 39);
    expect(Math.abs(wire.diameterMm / diameter - 1)).toBeLessThan(0.001);
    expect(Math.abs(wire.areaMm2 / ((Math.PI * diameter ** 2) / 4) - 1)).toBeLessThan(0.001);
    // 1000 ft are 304.8 m exactly.
    expect(Math.abs(wire.ohmsPerKm / (wire.ohmsPerThousandFeet / 0.3048) - 1)).toBeLessThan(0.004);
  });

  it.each(AWG_WIRES)('AWG $awg has the resistivity of annealed copper', (wire) => {
    // 1.7241e-8 ohm metre at 20 °C, from memory: the 100 % IACS value.
    const ohmsPerKm = (1.7241e-8 / (wire.areaMm2 * 1e-6)) * 1000;
    expect(Math.abs(ohmsPerKm / (wire.ohmsPerThousandFeet / 0.3048) - 1)).toBeLessThan(0.001);
  });

  it.each(METRIC_WIRES)('$standard, $mm2 mm2, lies between copper and 20 % more', (wire) => {
    const copper = 17.241 / wire.mm2;
    expect(wire.mostOhmsPerKm).toBeGreaterThan(copper);
    expect(wire.mostOhmsPerKm).toBeLessThan(copper * 1.2);
  });
});

describe('lamps', () => {
  it('agree with the watts printed for the 1157', () => {
    // A public note puts the 1157 at 27 W and 8 W.
    const bulb = BULBS.find(({ name }) => name === '1157')!;
    expect(bulb.filaments.map(({ watts }) => Math.round(watts))).toEqual([27, 8]);
  });

  it('have currents within their range', () => {
    for (const { amps, leastAmps = 0, mostAmps = Infinity } of LAMP_CURRENTS) {
      expect(leastAmps).toBeLessThan(mostAmps);
      if (amps === undefined) continue;
      expect(amps).toBeGreaterThanOrEqual(leastAmps);
      expect(amps).toBeLessThanOrEqual(mostAmps);
    }
  });

  it('draw far less as LED than as filament', () => {
    for (const use of ['marker', 'stopTurn', 'tail'] as const) {
      const [led, filament] = (['led', 'filament'] as const).map(
        (technology) =>
          LAMP_CURRENTS.find((row) => row.use === use && row.technology === technology)!.amps!,
      );
      expect(led! * 5).toBeLessThan(filament!);
    }
  });
});
