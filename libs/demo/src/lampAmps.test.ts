import { LAMP_CURRENTS } from '@lampwright/harness';
import type { LampUse } from '@lampwright/harness';
import { lampAmps } from './lampAmps';
import type { LampFunction } from './lampAmps';

const USES: Record<LampFunction, LampUse> = {
  tail: 'tail',
  stop: 'stopTurn',
  turn: 'stopTurn',
  'mid-turn': 'stopTurn',
  plate: 'plate',
  clearance: 'marker',
  'side-marker': 'marker',
  identification: 'marker',
  abs: 'marker',
  inflation: 'marker',
};

describe('lampAmps', () => {
  it.each(Object.entries(USES))('keeps an LED %s within common practice', (name, use) => {
    const range = LAMP_CURRENTS.find((each) => each.technology === 'led' && each.use === use);
    const amps = lampAmps('led', name as LampFunction);
    expect(amps).toBeGreaterThanOrEqual(range?.leastAmps ?? Infinity);
    expect(amps).toBeLessThanOrEqual(range?.mostAmps ?? -Infinity);
  });

  // An LED draws roughly a tenth of a filament lamp: trade pages.
  it.each(Object.keys(USES))('lets a filament %s draw several times the LED', (name) => {
    const times =
      lampAmps('filament', name as LampFunction) / lampAmps('led', name as LampFunction);
    expect(times).toBeGreaterThan(5);
    expect(times).toBeLessThan(16);
  });
});
