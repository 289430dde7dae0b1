import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { idLamps, lampPair } from '../lampGroups';

/**
 * 53 ft refrigerated van, LED. Black feeds the high lamps, brown the low ones. Blue feeds the ABS and, as the rules
 * allow, a position tracker and the tyre inflation lamp.
 */
export function refrigerated(): Harness {
  const plan = planBuilder('53 ft refrigerated van, high and low split', 'led');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, -0.7, 1],
    where: 'Front wall under the cooling unit, road side, hip height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose box',
    at: [0.4, -0.55, 0.95],
    where:
      'Nose box under the cooling unit. Four cover screws; keep clear of the unit’s own cables.',
    from: 'nose',
    handling: 'noseBox',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 nose junction',
    at: [0.8, -0.5, 0.95],
    where: 'Behind the nose box, first crossmember, moulded junction.',
    from: 'p1',
    awg: 12,
  });
  plan.plug({
    id: 'p2',
    label: 'P2 front header plug',
    at: [0.3, -1.1, 2.4],
    where: 'Road-side front corner post, beside the cooling unit, from a ladder.',
    from: 's1',
    handling: 'plugHigh',
    metres: 2.6,
  });
  plan.splice({
    id: 's2',
    label: 'S2 front header splice',
    at: [0.3, 0.1, 4],
    where: 'Front top rail above the cooling unit, behind the cover strip.',
    from: 'p2',
  });
  lampPair(plan, {
    id: 'front-clearance',
    label: 'Front clearance',
    along: 0.06,
    out: 1.15,
    up: 4.05,
    where: 'top front corner above the cooling unit, from a ladder. Two screws.',
    from: 's2',
    colour: 'amber',
    feeds: { clearance: 'markers' },
    handling: 'screwedHigh',
  });
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 0.9,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, a metre behind the nose. Grommet.',
    from: 's1',
    colour: 'amber',
    feeds: { 'side-marker': 'tail' },
    handling: 'grommet',
  });
  plan.plug({
    id: 'p3',
    label: 'P3 tracker plug',
    at: [1.5, 0.35, 0.95],
    where: 'Third crossmember, right of the centre, above the fuel tank.',
    from: 's1',
    handling: 'latch',
  });
  plan.module({
    id: 'tracker',
    label: 'Position tracker',
    at: [2, 0.6, 0.95],
    where: 'Above the fuel tank, curb side, a sealed box on the crossmember. Charges from blue.',
    from: 'p3',
    loads: { abs: 0.2 },
    handling: 'unit',
  });

  plan.plug({
    id: 'p4',
    label: 'P4 forward sill plug',
    at: [3.9, -0.5, 0.95],
    where: 'Behind the landing gear, road side, on the crossmember. Half a turn.',
    from: 's1',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 mid junction',
    at: [7.9, -0.5, 0.95],
    where: 'Half way back, road side, between the floor ducts.',
    from: 'p4',
    awg: 12,
  });
  plan.plug({
    id: 'p5',
    label: 'P5 mid curb plug',
    at: [7.9, 0.7, 0.95],
    where: 'Half way back, curb side, where the crossing loom leaves the floor duct.',
    from: 's3',
    handling: 'latch',
  });
  lampPair(plan, {
    id: 'mid',
    label: 'Mid marker and turn',
    along: 7.9,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, half way back. Two screws.',
    from: ['s3', 'p5'],
    colour: 'amber',
    feeds: { 'side-marker': 'tail', 'mid-turn': 'turn' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p6',
    label: 'P6 slider plug',
    at: [11.2, -0.5, 0.95],
    where: 'Ahead of the sliding axles, road side. Reach over the rail.',
    from: 's3',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 axle junction',
    at: [12, -0.5, 0.9],
    where: 'Above the front axle, in the loom clip on the slider rail.',
    from: 'p6',
    awg: 12,
  });
  plan.plug({
    id: 'p7',
    label: 'P7 ABS plug',
    at: [12.4, 0.1, 0.85],
    where: 'Between the axles, beside the relay valve. Lift the red lock first.',
    from: 's4',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [13, 0.1, 0.85],
    where: 'Between the axles, bolted to the relay valve on the crossmember.',
    from: 'p7',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });
  plan.lamp({
    id: 'inflation-lamp',
    label: 'Tyre inflation lamp',
    at: [12, -1.26, 1.3],
    where: 'Road side, bottom rail, above the front axle. Lit while a tyre is being filled.',
    from: 's4',
    colour: 'amber',
    feeds: { inflation: 'abs' },
    handling: 'grommet',
  });
  plan.plug({
    id: 'p8',
    label: 'P8 rear trunk plug',
    at: [14.3, -0.5, 0.9],
    where: 'Behind the rear axle, road side, knee height. Half a turn.',
    from: 's4',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's5',
    label: 'S5 rear junction',
    at: [15, -0.5, 0.9],
    where: 'A metre ahead of the rear sill, moulded junction.',
    from: 'p8',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [15, -1.26, 1.15],
    where: 'Road side, bottom rail, ahead of the rear marker, marked ABS. Grommet.',
    from: 's5',
    colour: 'amber',
    feeds: { abs: 'abs' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 15.4,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, ahead of the rear corner. Grommet.',
    from: 's5',
    colour: 'red',
    feeds: { 'side-marker': 'tail' },
    handling: 'grommet',
  });
  plan.plug({
    id: 'p9',
    label: 'P9 rear sill plug',
    at: [15.4, -0.4, 0.85],
    where: 'Behind the rear sill, road side, knee height. Half a turn.',
    from: 's5',
    handling: 'twist',
  });
  plan.splice({
    id: 's6',
    label: 'S6 rear sill splice',
    at: [15.7, -0.1, 0.8],
    where: 'Inside the rear sill channel, near the centre.',
    from: 'p9',
  });
  lampPair(plan, {
    id: 'stop-tail',
    label: 'Stop and tail',
    along: 16.05,
    out: 0.7,
    up: 0.75,
    where: 'rear sill, the inner lamp. Grommet.',
    from: 's6',
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'turn',
    label: 'Rear turn',
    along: 16,
    out: 0.95,
    up: 0.75,
    where: 'rear sill, the outer lamp. Grommet.',
    from: 's6',
    colour: 'amber',
    feeds: { turn: 'turn' },
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [15.82, -0.42, 0.65],
    where: 'Under the rear sill, road side, above the plate. Two screws.',
    from: 's6',
    colour: 'white',
    feeds: { plate: 'tail' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p10',
    label: 'P10 rear header plug',
    at: [15.75, 1.05, 1.3],
    where: 'Foot of the curb-side rear corner post, behind the splash plate.',
    from: 's5',
    handling: 'latch',
  });
  plan.splice({
    id: 's7',
    label: 'S7 rear header splice',
    at: [15.75, 0.3, 3.95],
    where: 'Inside the rear header above the doors.',
    from: 'p10',
    metres: 3.9,
  });
  idLamps(plan, {
    from: 's7',
    along: 16.1,
    up: 4.02,
    where: 'Rear header above the doors, from a ladder. Two screws.',
    wire: 'markers',
    handling: 'screwedHigh',
  });
  lampPair(plan, {
    id: 'rear-clearance',
    label: 'Rear clearance',
    along: 16.1,
    out: 1.2,
    up: 4.02,
    where: 'top rear corner, from a ladder. Two screws.',
    from: 's7',
    colour: 'red',
    feeds: { clearance: 'markers' },
    handling: 'screwedHigh',
  });

  return plan.build();
}
