import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { idLamps, lampPair } from '../lampGroups';

/**
 * 42 ft tank trailer, sealed LED lamps, cables in conduit between closed boxes. Black feeds side markers and plate,
 * brown everything else that runs. The plan serves reading and metering: no power-ups are made on this trailer.
 */
export function tank(): Harness {
  const plan = planBuilder('42 ft tank trailer, sealed boxes and conduit', 'led');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, -0.3, 1.2],
    where: 'Front bracket, road side of the centre, waist height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 front box plug',
    at: [0.6, -0.3, 1.2],
    where: 'Sealed front box behind the bracket. Threaded ring, hand tight.',
    from: 'nose',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 front box',
    at: [1, -0.3, 1.2],
    where: 'Inside the sealed front box: the terminal strip. Do not open it in a vapour area.',
    from: 'p1',
    awg: 12,
  });
  plan.splice({
    id: 's2',
    label: 'S2 front head box',
    at: [0.9, 0.25, 2.6],
    where: 'Small box at the top of the front head, end of the conduit.',
    from: 's1',
  });
  lampPair(plan, {
    id: 'front-clearance',
    label: 'Front clearance',
    along: 0.7,
    out: 1.1,
    up: 2.2,
    where: 'bracket on the front head, from a ladder. Two screws.',
    from: 's2',
    colour: 'amber',
    feeds: { clearance: 'tail' },
    handling: 'screwedHigh',
  });
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 1.3,
    out: 1.24,
    up: 1.1,
    where: 'front fender bracket. Two screws.',
    from: 's1',
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p2',
    label: 'P2 sill conduit plug',
    at: [3.9, -0.5, 1.05],
    where: 'Behind the landing gear, road-side sill, end of the first conduit. Threaded ring.',
    from: 's1',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 mid box',
    at: [6.3, -0.5, 1.05],
    where: 'Sealed box half way back, road-side sill, ahead of the outlet valves.',
    from: 'p2',
    awg: 12,
  });
  lampPair(plan, {
    id: 'mid',
    label: 'Mid marker and turn',
    along: 6.3,
    out: 1.24,
    up: 1.05,
    where: 'bracket on the sill, half way back. Two screws.',
    from: 's3',
    colour: 'amber',
    feeds: { 'side-marker': 'markers', 'mid-turn': 'turn' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p3',
    label: 'P3 axle conduit plug',
    at: [8.9, -0.5, 1],
    where: 'Behind the outlet cabinet, road-side sill, end of the second conduit. Threaded ring.',
    from: 's3',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 axle box',
    at: [9.6, -0.5, 0.95],
    where: 'Sealed box above the front axle, road side.',
    from: 'p3',
    awg: 12,
  });
  plan.plug({
    id: 'p4',
    label: 'P4 ABS plug',
    at: [10, 0.1, 0.9],
    where: 'Between the axles, beside the relay valve. Lift the red lock first.',
    from: 's4',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [10.6, 0.1, 0.9],
    where: 'Between the axles, bolted to the relay valve.',
    from: 'p4',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });
  plan.plug({
    id: 'p5',
    label: 'P5 rear conduit plug',
    at: [11.4, -0.5, 0.95],
    where: 'Behind the rear axle, road side, end of the last conduit. Threaded ring.',
    from: 's4',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's5',
    label: 'S5 rear box',
    at: [11.9, -0.35, 0.95],
    where: 'Sealed box inside the rear bumper, road side of the centre.',
    from: 'p5',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [11.75, -1.24, 1],
    where: 'Road side, rear fender bracket, ahead of the rear marker, marked ABS. Riveted.',
    from: 's5',
    colour: 'amber',
    feeds: { abs: 'abs' },
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 12.2,
    out: 1.24,
    up: 1,
    where: 'end of the rear bumper, facing sideways. Two screws.',
    from: 's5',
    colour: 'red',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });
  lampPair(plan, {
    id: 'rear',
    label: 'Tail, stop and turn',
    along: 12.7,
    out: 0.9,
    up: 0.9,
    where: 'rear bumper, large round lamp in a grommet, three wires.',
    from: 's5',
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop', turn: 'turn' },
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [12.4, -0.5, 0.75],
    where: 'Under the rear bumper, road side, above the plate. Riveted.',
    from: 's5',
    colour: 'white',
    feeds: { plate: 'markers' },
  });
  plan.splice({
    id: 's6',
    label: 'S6 rear head box',
    at: [12.1, 0.3, 2.6],
    where: 'Small box on the rear head, end of the conduit.',
    from: 's5',
  });
  idLamps(plan, {
    from: 's6',
    along: 12.55,
    up: 2.7,
    where: 'Bracket on the rear head, from a ladder. Two screws.',
    wire: 'tail',
    handling: 'screwedHigh',
  });
  lampPair(plan, {
    id: 'rear-clearance',
    label: 'Rear clearance',
    along: 12.4,
    out: 1.1,
    up: 2.2,
    where: 'bracket on the rear head, from a ladder. Two screws.',
    from: 's6',
    colour: 'red',
    feeds: { clearance: 'tail' },
    handling: 'screwedHigh',
  });

  return plan.build();
}
