import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { idLamps } from '../lampGroups';

/**
 * 40 ft gooseneck container chassis. All lamps riveted in steel boxes or brackets; only plugs open. Black feeds
 * the road side's markers and the plate, brown the curb side's and all tails: the loads are balanced by sides.
 */
export function containerChassis(): Harness {
  const plan = planBuilder('40 ft container chassis, split by sides', 'filament');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, -0.3, 1.15],
    where: 'Front bolster, road side of the centre, waist height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose plug',
    at: [0.4, -0.3, 1.15],
    where: 'Behind the front bolster, between the gooseneck rails.',
    from: 'nose',
    handling: 'latch',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 bolster junction',
    at: [0.75, -0.3, 1.15],
    where: 'Junction block inside the gooseneck, behind the front bolster.',
    from: 'p1',
    awg: 12,
  });
  for (const [side, words, sign, wire] of [
    ['road', 'road side', -1, 'markers'],
    ['curb', 'curb side', 1, 'tail'],
  ] as const) {
    plan.lamp({
      id: `front-clearance-${side}`,
      label: `Front clearance, ${words}`,
      at: [0.12, sign * 1.15, 1.2],
      where: `Outer end of the front bolster, ${words}, in a steel guard. Riveted.`,
      from: 's1',
      colour: 'amber',
      feeds: { clearance: wire },
    });
    plan.lamp({
      id: `front-marker-${side}`,
      label: `Front marker, ${words}`,
      at: [0.5, sign * 1.18, 1.1],
      where: `Back of the front bolster, ${words}, facing sideways. Riveted.`,
      from: 's1',
      colour: 'amber',
      feeds: { 'side-marker': wire },
    });
  }
  plan.plug({
    id: 'p2',
    label: 'P2 gooseneck plug',
    at: [2.7, -0.4, 1.1],
    where: 'Where the gooseneck steps down, road-side rail, inner face. An arm in over the rail.',
    from: 's1',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's2',
    label: 'S2 mid junction',
    at: [6, -0.4, 1],
    where: 'Half way back, road-side rail, inner face, under a clip plate.',
    from: 'p2',
    awg: 12,
  });
  plan.plug({
    id: 'p3',
    label: 'P3 mid road plug',
    at: [6.2, -0.85, 1],
    where: 'Half way back, on the road-side lamp bracket.',
    from: 's2',
    handling: 'latch',
  });
  plan.plug({
    id: 'p4',
    label: 'P4 mid curb plug',
    at: [6.2, 0.7, 1],
    where: 'Half way back, on the curb-side lamp bracket.',
    from: 's2',
    handling: 'latch',
  });
  plan.lamp({
    id: 'mid-road',
    label: 'Mid marker and turn, road side',
    at: [6.2, -1.18, 1],
    where: 'Road side, half way back, on an outrigger bracket. Riveted.',
    from: 'p3',
    colour: 'amber',
    feeds: { 'side-marker': 'markers', 'mid-turn': 'left' },
  });
  plan.lamp({
    id: 'mid-curb',
    label: 'Mid marker and turn, curb side',
    at: [6.2, 1.18, 1],
    where: 'Curb side, half way back, on an outrigger bracket. Riveted.',
    from: 'p4',
    colour: 'amber',
    feeds: { 'side-marker': 'tail', 'mid-turn': 'right' },
  });
  plan.plug({
    id: 'p5',
    label: 'P5 slider plug',
    at: [8.5, -0.4, 1],
    where:
      'Ahead of the sliding axles, road-side rail. Half a turn; check the coiled cable for chafing.',
    from: 's2',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 'coil',
    label: 'Slider coil cable',
    at: [9.1, -0.4, 0.95],
    where: 'Coiled cable above the front axle, between the rail and the slider box.',
    from: 'p5',
    awg: 12,
    faultWeight: 4,
  });
  plan.plug({
    id: 'p6',
    label: 'P6 ABS plug',
    at: [9.6, 0.1, 0.9],
    where: 'Between the axles, left of the relay valve.',
    from: 'coil',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [10.2, 0.1, 0.9],
    where: 'Between the axles, bolted to the relay valve.',
    from: 'p6',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });
  plan.plug({
    id: 'p7',
    label: 'P7 tail plug',
    at: [10.9, -0.4, 0.95],
    where: 'Behind the rear axle, road-side rail, knee height. Half a turn.',
    from: 'coil',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 rear junction',
    at: [11.35, -0.4, 0.95],
    where: 'Junction block ahead of the rear bolster, road-side rail.',
    from: 'p7',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [11.35, -1.18, 1],
    where: 'Road side, on the bracket ahead of the lamp box, marked ABS. Riveted.',
    from: 's3',
    colour: 'amber',
    feeds: { abs: 'abs' },
  });
  plan.plug({
    id: 'p8',
    label: 'P8 road lamp box plug',
    at: [11.65, -0.75, 0.9],
    where: 'Inner end of the road-side lamp box, behind the rear bolster.',
    from: 's3',
    handling: 'latch',
  });
  plan.plug({
    id: 'p9',
    label: 'P9 curb lamp box plug',
    at: [11.65, 0.75, 0.9],
    where: 'Inner end of the curb-side lamp box, behind the rear bolster.',
    from: 's3',
    handling: 'latch',
  });
  for (const [side, words, sign, feed, turn, wire] of [
    ['road', 'road side', -1, 'p8', 'left', 'markers'],
    ['curb', 'curb side', 1, 'p9', 'right', 'tail'],
  ] as const) {
    plan.splice({
      id: `box-${side}`,
      label: `Lamp box splices, ${words}`,
      at: [11.9, sign * 0.75, 0.9],
      where: `Inside the lamp box, ${words}, behind the two lamps.`,
      from: feed,
    });
    plan.lamp({
      id: `stop-tail-${side}`,
      label: `Stop and tail, ${words}`,
      at: [12.12, sign * 0.65, 0.9],
      where: `Lamp box, ${words}, the inner lamp. Riveted.`,
      from: `box-${side}`,
      colour: 'red',
      feeds: { tail: 'tail', stop: 'stop' },
    });
    plan.lamp({
      id: `turn-${side}`,
      label: `Rear turn, ${words}`,
      at: [12.12, sign * 0.92, 0.9],
      where: `Lamp box, ${words}, the outer lamp. Riveted.`,
      from: `box-${side}`,
      colour: 'amber',
      feeds: { turn },
    });
    plan.lamp({
      id: `rear-marker-${side}`,
      label: `Rear marker, ${words}`,
      at: [11.85, sign * 1.18, 0.95],
      where: `End of the lamp box, ${words}, facing sideways. Riveted.`,
      from: `box-${side}`,
      colour: 'red',
      feeds: { 'side-marker': wire },
    });
    plan.lamp({
      id: `rear-clearance-${side}`,
      label: `Rear clearance, ${words}`,
      at: [12.12, sign * 1.18, 1.2],
      where: `Outer end of the rear bolster, ${words}. Riveted.`,
      from: `box-${side}`,
      colour: 'red',
      feeds: { clearance: wire },
    });
  }
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [11.85, -0.38, 0.8],
    where: 'Under the rear bolster, road side, above the plate. Riveted.',
    from: 's3',
    colour: 'white',
    feeds: { plate: 'markers' },
  });
  plan.plug({
    id: 'p10',
    label: 'P10 ID lamp plug',
    at: [11.75, 0.1, 1.1],
    where: 'Behind the middle of the rear bolster, at the ID lamp box.',
    from: 's3',
    handling: 'latch',
  });
  idLamps(plan, {
    from: 'p10',
    along: 12.12,
    up: 1.2,
    where: 'Middle of the rear bolster, in a steel box. Riveted.',
    wire: 'tail',
  });

  return plan.build();
}
