import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import { lampPair } from '../lampGroups';

/**
 * 16 ft utility trailer, filament lamps, under 80 in wide: no clearance or identification lamps, no ABS. Black
 * feeds the side markers and the plate lamp, brown only the tails.
 */
export function utility(): Harness {
  const plan = planBuilder('16 ft utility trailer, filament lamps', 'filament');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, 0.05, 0.6],
    where: 'On the drawbar, behind the coupler, knee height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 drawbar plug',
    at: [0.45, 0, 0.55],
    where: 'Under the drawbar, behind the jack.',
    from: 'nose',
    handling: 'latch',
  });
  plan.splice({
    id: 's1',
    label: 'S1 front splice',
    at: [0.9, 0, 0.55],
    where: 'First crossmember, centre: five butt splices under tape.',
    from: 'p1',
  });
  for (const [side, words, sign] of [
    ['road', 'road side', -1],
    ['curb', 'curb side', 1],
  ] as const) {
    plan.splice({
      id: `marker-splice-${side}`,
      label: `Front marker splice, ${words}`,
      at: [0.9, sign * 0.65, 0.55],
      where: `Inside the front rail, ${words}, a butt splice a hand's width from the lamp.`,
      from: 's1',
      awg: 16,
    });
  }
  lampPair(plan, {
    id: 'front-marker',
    label: 'Front marker',
    along: 0.9,
    out: 0.95,
    up: 0.6,
    where: 'side rail, front end. Two screws.',
    from: ['marker-splice-road', 'marker-splice-curb'],
    colour: 'amber',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });
  plan.plug({
    id: 'p2',
    label: 'P2 rail plug',
    at: [2.6, -0.7, 0.5],
    where: 'Inside the road-side rail, ahead of the fender. Bullet connectors under tape.',
    from: 's1',
    handling: 'taped',
  });
  plan.splice({
    id: 's2',
    label: 'S2 rear splice, road',
    at: [4.1, -0.7, 0.5],
    where: 'Inside the road-side rail, behind the fender, under tape.',
    from: 'p2',
  });
  plan.plug({
    id: 'p3',
    label: 'P3 crossing plug',
    at: [4.1, 0, 0.5],
    where: 'Last crossmember, centre, where the loom crosses to the curb side.',
    from: 's2',
    handling: 'latch',
  });
  plan.splice({
    id: 's3',
    label: 'S3 rear splice, curb',
    at: [4.1, 0.7, 0.5],
    where: 'Inside the curb-side rail, behind the fender, under tape.',
    from: 'p3',
  });
  lampPair(plan, {
    id: 'rear-marker',
    label: 'Rear marker',
    along: 4.4,
    out: 0.95,
    up: 0.6,
    where: 'side rail, rear end. Two screws.',
    from: ['s2', 's3'],
    colour: 'red',
    feeds: { 'side-marker': 'markers' },
    handling: 'screwed',
  });
  lampPair(plan, {
    id: 'stop-tail',
    label: 'Stop and tail',
    along: 4.82,
    out: 0.6,
    up: 0.6,
    where: 'rear rail, the inner lamp. Plug on the pigtail.',
    from: ['s2', 's3'],
    colour: 'red',
    feeds: { tail: 'tail', stop: 'stop' },
    handling: 'pigtail',
  });
  for (const [side, words, sign, feed] of [
    ['road', 'road side', -1, 's2'],
    ['curb', 'curb side', 1, 's3'],
  ] as const) {
    plan.splice({
      id: `turn-splice-${side}`,
      label: `Turn lamp splice, ${words}`,
      at: [4.5, sign * 0.62, 0.5],
      where: `Behind the rear rail, ${words}, a butt splice where the lamp was once replaced.`,
      from: feed,
      awg: 16,
    });
  }
  lampPair(plan, {
    id: 'turn',
    label: 'Rear turn',
    along: 4.82,
    out: 0.88,
    up: 0.6,
    where: 'rear rail, the outer lamp. Plug on the pigtail.',
    from: ['turn-splice-road', 'turn-splice-curb'],
    colour: 'amber',
    feeds: { turn: 'turn' },
    handling: 'pigtail',
  });
  plan.splice({
    id: 'plate-splice',
    label: 'Plate lamp splice',
    at: [4.5, -0.3, 0.5],
    where: 'Behind the rear rail, road side of the centre, a butt splice.',
    from: 's2',
    awg: 16,
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [4.82, -0.3, 0.55],
    where: 'Rear rail, above the plate. Riveted bracket, spliced in.',
    from: 'plate-splice',
    colour: 'white',
    feeds: { plate: 'markers' },
  });

  return plan.build();
}
