import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { idLamps, lampPair } from '../lampGroups';

/**
 * 53 ft van, all LED. Black feeds the clearance lamps and the forward side markers; brown feeds tail, plate,
 * identification and the rear side markers.
 */
export function dryVan(): Harness {
  const plan = planBuilder('53 ft dry van, LED, lower road-side harness', 'led');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, -0.4, 1.05],
    where: 'Front wall, road side of the centre, hip height. Seven contacts under a spring cover.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose plug',
    at: [0.45, -0.4, 1],
    where: 'Behind the nose socket, under the front sill. Half a turn to open.',
    from: 'nose',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 nose junction',
    at: [0.95, -0.4, 1],
    where: 'Moulded junction on the second crossmember, half a metre behind P1.',
    from: 'p1',
    awg: 12,
  });
  plan.plug({
    id: 'p2',
    label: 'P2 front wall plug',
    at: [0.45, 0.35, 1.3],
    where: 'At the foot of the front wall, right of the centre, chest height, under a rubber boot.',
    from: 's1',
    handling: 'latch',
  });
  plan.splice({
    id: 's2',
    label: 'S2 front header splice',
    at: [0.25, 0.1, 3.95],
    where: 'Inside the front top rail, behind the cover strip.',
    from: 'p2',
    metres: 3.4,
  });
  lampPair(plan, {
    id: 'front-clearance',
    label: 'Front clearance',
    along: 0.08,
    out: 1.15,
    up: 4,
    where: 'top front corner, from a ladder. Grommet.',
    from: 's2',
    colour: 'amber',
    feeds: { clearance: 'markers' },
    handling: 'grommetHigh',
  });
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 0.95,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, a metre behind the nose, chest height. Grommet.',
    from: 's1',
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'grommet',
  });

  plan.plug({
    id: 'p3',
    label: 'P3 forward sill plug',
    at: [3.6, -0.4, 1],
    where: 'Behind the landing gear, road side of the centre, on a crossmember. Half a turn.',
    from: 's1',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 mid junction',
    at: [8.1, -0.4, 1],
    where: 'Half way back, under the floor, taped to the crossmember.',
    from: 'p3',
    awg: 12,
  });
  plan.plug({
    id: 'p4',
    label: 'P4 mid crossing plug',
    at: [8.1, 0.55, 1],
    where: 'Half way back, right of the centre, where the pigtail crosses to the curb side.',
    from: 's3',
    handling: 'latch',
    awg: 16,
  });
  lampPair(plan, {
    id: 'mid-marker',
    label: 'Mid marker',
    along: 8.1,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, half way back, chest height. Grommet.',
    from: ['s3', 'p4'],
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'grommet',
  });

  plan.plug({
    id: 'p5',
    label: 'P5 slider plug',
    at: [11.3, -0.4, 1],
    where: 'Ahead of the sliding axles, on the frame rail, road side. Reach over the rail.',
    from: 's3',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 axle junction',
    at: [12, -0.4, 0.95],
    where: 'Above the front axle, in the loom clip on the slider rail.',
    from: 'p5',
    awg: 12,
  });
  plan.plug({
    id: 'p6',
    label: 'P6 ABS plug',
    at: [12.5, 0.15, 0.9],
    where: 'Between the axles, on the bracket beside the relay valve. Lift the red lock first.',
    from: 's4',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [13.1, 0.15, 0.9],
    where: 'Between the axles, bolted to the relay valve on the crossmember.',
    from: 'p6',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });

  plan.plug({
    id: 'p7',
    label: 'P7 rear trunk plug',
    at: [14.4, -0.4, 0.95],
    where:
      'Behind the rear axle, road side, on the last but two crossmember, knee height. Half a turn.',
    from: 's4',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's5',
    label: 'S5 rear junction',
    at: [15.1, -0.4, 0.95],
    where: 'A metre ahead of the rear sill, moulded junction on the crossmember.',
    from: 'p7',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [15.1, -1.26, 1.15],
    where:
      'Road side, bottom rail, a hand ahead of the rear marker, marked ABS. The module switches it.',
    from: 's5',
    colour: 'amber',
    feeds: { abs: 'abs' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 15.5,
    out: 1.25,
    up: 1.2,
    where: 'bottom rail, half a metre ahead of the rear corner, chest height. Grommet.',
    from: 's5',
    colour: 'red',
    feeds: { 'side-marker': 'tail' },
    handling: 'grommet',
  });
  plan.plug({
    id: 'p8',
    label: 'P8 rear light bar plug',
    at: [15.4, -0.4, 0.85],
    where: 'Behind the last crossmember, road side, knee height. Half a turn.',
    from: 's5',
    handling: 'twist',
  });
  plan.splice({
    id: 's6',
    label: 'S6 light bar splice',
    at: [15.75, -0.15, 0.8],
    where: 'Inside the rear sill channel, left of the centre.',
    from: 'p8',
  });
  lampPair(plan, {
    id: 'rear',
    label: 'Tail, stop and turn',
    along: 16.02,
    out: 0.9,
    up: 0.75,
    where: 'rear sill, hip height. Round lamp in a grommet, three wires.',
    from: 's6',
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop', turn: 'turn' },
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [16.05, -0.6, 0.7],
    where: 'Rear sill, left of the centre, above the plate. Two screws.',
    from: 's6',
    colour: 'white',
    feeds: { plate: 'tail' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p9',
    label: 'P9 rear header plug',
    at: [15.7, -1.05, 1.3],
    where: 'Foot of the road-side rear corner post, chest height, behind the splash plate.',
    from: 's5',
    handling: 'latch',
  });
  plan.splice({
    id: 's7',
    label: 'S7 rear header splice',
    at: [15.8, 0.15, 3.95],
    where: 'Inside the rear header above the doors.',
    from: 'p9',
    metres: 4.2,
  });
  idLamps(plan, {
    from: 's7',
    along: 16.08,
    up: 4,
    where: 'Rear header above the doors, from a ladder. Grommet.',
    wire: 'tail',
    handling: 'grommetHigh',
  });
  lampPair(plan, {
    id: 'rear-clearance',
    label: 'Rear clearance',
    along: 16.08,
    out: 1.18,
    up: 4,
    where: 'top rear corner, from a ladder. Grommet.',
    from: 's7',
    colour: 'red',
    feeds: { clearance: 'markers' },
    handling: 'grommetHigh',
  });

  return plan.build();
}
