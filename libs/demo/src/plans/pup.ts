import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { WIRES } from '../circuits';
import { idLamps, lampPair } from '../lampGroups';

/**
 * 28 ft pup with a rear socket for the next trailer of a set. Under 30 ft, so no intermediate markers. Black feeds
 * the front half and the plate lamp; brown feeds everything at the rear.
 */
export function pup(): Harness {
  const plan = planBuilder('28 ft pup, LED, centre harness, rear socket', 'led');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, 0.25, 1],
    where: 'Front wall, curb side of the centre, hip height, in a recessed box.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose plug',
    at: [0.4, 0.15, 0.95],
    where: 'Behind the recessed nose box, under the floor. Half a turn.',
    from: 'nose',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 nose junction',
    at: [0.85, 0, 0.95],
    where: 'Second crossmember, on the centre line, moulded junction.',
    from: 'p1',
    awg: 12,
  });
  plan.plug({
    id: 'p2',
    label: 'P2 front wall plug',
    at: [0.4, -0.5, 1.2],
    where: 'Foot of the front wall, road side, behind the kick plate.',
    from: 's1',
    handling: 'latch',
  });
  plan.splice({
    id: 's2',
    label: 'S2 front header splice',
    at: [0.3, -0.15, 3.85],
    where: 'Inside the front top rail, road side of the centre.',
    from: 'p2',
    metres: 3.3,
  });
  lampPair(plan, {
    id: 'front-clearance',
    label: 'Front clearance',
    along: 0.08,
    out: 1.15,
    up: 3.95,
    where: 'top front corner, from a ladder. Grommet.',
    from: 's2',
    colour: 'amber',
    feeds: { clearance: 'markers' },
    handling: 'grommetHigh',
  });
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 0.85,
    out: 1.25,
    up: 1.1,
    where: 'bottom rail, just behind the nose. Grommet.',
    from: 's1',
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'grommet',
  });

  plan.plug({
    id: 'p3',
    label: 'P3 trunk plug',
    at: [3.9, 0, 0.95],
    where: 'Under the floor on the centre line, behind the landing gear. Half a turn.',
    from: 's1',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 axle junction',
    at: [6, 0, 0.95],
    where: 'Ahead of the axle on the centre line, moulded junction.',
    from: 'p3',
    awg: 12,
  });
  plan.plug({
    id: 'p4',
    label: 'P4 ABS plug',
    at: [6.3, 0.45, 0.9],
    where: 'Curb side of the axle, on the valve bracket. Lift the red lock first.',
    from: 's3',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [6.9, 0.45, 0.9],
    where: 'Above the axle, curb side, bolted to the relay valve.',
    from: 'p4',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });
  plan.plug({
    id: 'p5',
    label: 'P5 rear plug',
    at: [7.3, 0, 0.9],
    where: 'Behind the axle on the centre line, knee height. Half a turn.',
    from: 's3',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 rear junction',
    at: [7.7, 0, 0.9],
    where: 'Last crossmember but one, on the centre line, moulded junction.',
    from: 'p5',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [7.6, -1.26, 1.1],
    where: 'Road side, bottom rail, ahead of the rear marker, marked ABS. Grommet.',
    from: 's4',
    colour: 'amber',
    feeds: { abs: 'abs' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 8,
    out: 1.25,
    up: 1.1,
    where: 'bottom rail, ahead of the rear corner. Grommet.',
    from: 's4',
    colour: 'red',
    feeds: { 'side-marker': 'tail' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'rear',
    label: 'Tail, stop and turn',
    along: 8.4,
    out: 0.85,
    up: 0.8,
    where: 'rear sill, outside the bumper post. Oval lamp in a grommet, three wires.',
    from: 's4',
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop', turn: 'turn' },
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [8.4, -0.55, 0.7],
    where: 'Rear sill, road side, above the plate. Two screws.',
    from: 's4',
    colour: 'white',
    feeds: { plate: 'markers' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p6',
    label: 'P6 rear header plug',
    at: [8.1, 1.05, 1.2],
    where: 'Foot of the curb-side rear post, behind a rubber flap.',
    from: 's4',
    handling: 'latch',
  });
  plan.splice({
    id: 's5',
    label: 'S5 rear header splice',
    at: [8.15, 0.25, 3.85],
    where: 'Inside the rear header above the roll-up door.',
    from: 'p6',
    metres: 4,
  });
  plan.plug({
    id: 'p7',
    label: 'P7 rear socket plug',
    at: [8, 0.45, 0.85],
    where: 'Behind the rear sill, right of the centre, where the cable to the rear socket begins.',
    from: 's4',
    handling: 'latch',
    awg: 12,
  });
  plan.splice({
    id: 'rear-socket',
    label: 'Rear socket',
    at: [8.45, 0.57, 0.8],
    where:
      'Rear sill, right of the centre: the socket for the next trailer. Look for green contacts.',
    from: 'p7',
    awg: 12,
    ends: WIRES,
    faultWeight: 2,
  });
  idLamps(plan, {
    from: 's5',
    along: 8.45,
    up: 3.95,
    where: 'Rear header above the door, from a ladder. Grommet.',
    wire: 'tail',
    handling: 'grommetHigh',
  });
  lampPair(plan, {
    id: 'rear-clearance',
    label: 'Rear clearance',
    along: 8.45,
    out: 1.15,
    up: 3.95,
    where: 'top rear corner, from a ladder. Grommet.',
    from: 's5',
    colour: 'red',
    feeds: { clearance: 'tail' },
    handling: 'grommetHigh',
  });

  return plan.build();
}
