import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { idLamps, lampPair } from '../lampGroups';

/**
 * 48 ft flatbed, filament lamps. Black feeds every clearance and side marker lamp; brown feeds tail, plate and
 * identification. Stop and tail share a bulb, turn has its own.
 */
export function flatbed(): Harness {
  const plan = planBuilder(
    '48 ft flatbed, filament lamps, wires in the road-side beam',
    'filament',
  );

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, -0.35, 1.1],
    where: 'Front beam, road side of the centre, waist height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose box',
    at: [0.4, -0.35, 1.1],
    where: 'Nose box behind the front beam. Four cover screws; the plug is inside.',
    from: 'nose',
    handling: 'noseBox',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 box studs',
    at: [0.75, -0.35, 1.1],
    where: 'Studs at the back of the nose box, with ring terminals.',
    from: 'p1',
    awg: 12,
  });
  plan.plug({
    id: 'p2',
    label: 'P2 headboard plug',
    at: [0.4, 0.3, 1.3],
    where: 'Foot of the headboard, right of the centre. Bullet connectors under tape.',
    from: 's1',
    handling: 'taped',
  });
  lampPair(plan, {
    id: 'front-clearance',
    label: 'Front clearance',
    along: 0.1,
    out: 1.2,
    up: 1.9,
    where: 'outer edge of the headboard, eye height. Two screws.',
    from: 'p2',
    colour: 'amber',
    feeds: { clearance: 'markers' },
    handling: 'screwed',
  });
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 0.75,
    out: 1.24,
    up: 1.15,
    where: 'side rail, behind the first stake pocket. Two screws.',
    from: 's1',
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });

  plan.plug({
    id: 'p3',
    label: 'P3 forward beam plug',
    at: [4.4, -0.45, 1],
    where: 'Inside the road-side beam, behind the landing gear. Latch faces the centre.',
    from: 's1',
    handling: 'latch',
    awg: 12,
  });
  plan.splice({
    id: 's2',
    label: 'S2 mid splice, road',
    at: [7.2, -0.45, 1],
    where: 'Inside the road-side beam, half way back, six butt splices under one sleeve.',
    from: 'p3',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 mid splice, curb',
    at: [7.2, 0.45, 1],
    where: 'Inside the curb-side beam, half way back, where the crossing pigtail ends.',
    from: 's2',
  });
  lampPair(plan, {
    id: 'mid',
    label: 'Mid marker and turn',
    along: 7.2,
    out: 1.24,
    up: 1.1,
    where: 'side rail, half way back. Plug on the pigtail behind the bracket.',
    from: ['s2', 's3'],
    colour: 'amber',
    feeds: { 'side-marker': 'markers', 'mid-turn': 'turn' },
    handling: 'pigtail',
  });

  plan.plug({
    id: 'p4',
    label: 'P4 rear beam plug',
    at: [9.9, -0.45, 1],
    where: 'Inside the road-side beam, ahead of the front spring hanger. Latch faces the centre.',
    from: 's2',
    handling: 'latch',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 ABS tap',
    at: [10.7, -0.45, 0.95],
    where: 'Inside the road-side beam, above the front axle, taped.',
    from: 'p4',
    awg: 12,
  });
  plan.plug({
    id: 'p5',
    label: 'P5 ABS plug',
    at: [11.1, 0.1, 0.9],
    where: 'On the crossmember between the axles, right of the air tank.',
    from: 's4',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [11.7, 0.1, 0.9],
    where: 'Bolted to the relay valve between the axles. Red lock on the plug.',
    from: 'p5',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });

  plan.plug({
    id: 'p6',
    label: 'P6 tail plug',
    at: [12.9, -0.45, 0.95],
    where: 'End of the road-side beam, above the rear axle. An arm in behind the spring hanger.',
    from: 's4',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's5',
    label: 'S5 running splice',
    at: [13.4, -0.45, 0.95],
    where: 'Last bay of the road-side beam: the black and brown butt splices.',
    from: 'p6',
  });
  plan.splice({
    id: 's6',
    label: 'S6 stop and turn splice',
    at: [13.4, -0.1, 0.95],
    where: 'Last bay, beside the beam: the red, yellow and green butt splices.',
    from: 'p6',
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [13.5, -1.25, 1.1],
    where: 'Road side rail, ahead of the rear marker, marked ABS. Riveted, spliced in.',
    from: 's5',
    colour: 'amber',
    feeds: { abs: 'abs' },
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 13.9,
    out: 1.24,
    up: 1.1,
    where: 'side rail, ahead of the rear corner. Two screws.',
    from: 's5',
    colour: 'red',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });
  plan.splice({
    id: 's7',
    label: 'S7 rear rail splice, road',
    at: [14.1, -0.6, 0.9],
    where: 'Behind the rear rail, road side, at the grommet where the wires come through.',
    from: { markers: 's5', tail: 's5', stop: 's6', left: 's6' },
  });
  plan.splice({
    id: 's8',
    label: 'S8 rear rail splice, curb',
    at: [14.1, 0.6, 0.9],
    where: 'Behind the rear rail, curb side, at the grommet where the wires come through.',
    from: { markers: 's5', tail: 's5', stop: 's6', right: 's6' },
  });
  lampPair(plan, {
    id: 'rear-clearance',
    label: 'Rear clearance',
    along: 14.55,
    out: 1.22,
    up: 1.15,
    where: 'outer end of the rear rail. Two screws.',
    from: ['s7', 's8'],
    colour: 'red',
    feeds: { clearance: 'markers' },
    handling: 'screwed',
  });
  lampPair(plan, {
    id: 'turn',
    label: 'Rear turn',
    along: 14.5,
    out: 0.95,
    up: 0.9,
    where: 'rear rail, the outer of the two round lamps. Grommet.',
    from: ['s7', 's8'],
    colour: 'amber',
    feeds: { turn: 'turn' },
    handling: 'grommet',
  });
  lampPair(plan, {
    id: 'stop-tail',
    label: 'Stop and tail',
    along: 14.5,
    out: 0.65,
    up: 0.9,
    where: 'rear rail, the inner of the two round lamps. Grommet.',
    from: ['s7', 's8'],
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop' },
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [14.25, -0.33, 0.75],
    where: 'Under the rear rail, road side, above the plate. Riveted bracket, spliced in.',
    from: 's7',
    colour: 'white',
    feeds: { plate: 'tail' },
  });
  plan.plug({
    id: 'p7',
    label: 'P7 ID lamp plug',
    at: [14.1, 0.15, 0.9],
    where: 'Behind the middle of the rear rail. Bullet connector under tape.',
    from: 's8',
    handling: 'taped',
  });
  idLamps(plan, {
    from: 'p7',
    along: 14.5,
    up: 1.05,
    where: 'Middle of the rear rail. Sealed strip, riveted.',
    wire: 'tail',
  });

  return plan.build();
}
