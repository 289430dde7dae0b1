import type { Harness } from '@lampwright/harness';
import { planBuilder } from '../builder';
import type { PlanBuilder } from '../builder';
import { idLamps, lampPair } from '../lampGroups';

const SIDES = [
  { id: 'road', letter: 'R', words: 'road side', sign: -1, wire: 'markers', turn: 'left' },
  { id: 'curb', letter: 'C', words: 'curb side', sign: 1, wire: 'tail', turn: 'right' },
] as const;

/** Where the lamps of a rail stand, in metres from the front, and what plugs the rail has ahead of them. */
interface Rail {
  id: 'low' | 'high';
  words: string;
  up: number;
  lampOut: number;
  spliceOut: number;
  /** Metres along of each rail plug, with the lamps behind it. */
  bays: readonly { plug: number; lamps: readonly number[] }[];
  /** Lamps that are mid turns too. */
  turns: readonly number[];
}

const LOW: Rail = {
  id: 'low',
  words: 'lower rail',
  up: 0.9,
  lampOut: 1.26,
  spliceOut: 0.95,
  bays: [
    { plug: 1.3, lamps: [1.8, 3.6, 5.4] },
    { plug: 6.3, lamps: [7.2, 9, 10.8] },
    { plug: 11.7, lamps: [12.6, 14.4] },
  ],
  turns: [7.2, 10.8],
};

const HIGH: Rail = {
  id: 'high',
  words: 'upper deck rail',
  up: 2.9,
  lampOut: 1.22,
  spliceOut: 0.6,
  bays: [
    { plug: 2.1, lamps: [2.7, 4.5, 6.3] },
    { plug: 8, lamps: [8.6, 10.2, 11.8, 13.4] },
  ],
  turns: [],
};

/** One rail of one side: plugs in a chain, behind each a row of tee splices with a marker lamp at each. */
function rail(plan: PlanBuilder, layout: Rail, side: (typeof SIDES)[number], feed: string): void {
  const high = layout.id === 'high';
  let from = feed;
  let count = 0;
  layout.bays.forEach((bay, index) => {
    const plug = `p-${layout.id}-${side.id}-${index + 1}`;
    const name = `${side.letter}${high ? 'U' : 'L'}${index + 1}`;
    plan.plug({
      id: plug,
      label: `${name} ${layout.words} plug`,
      at: [bay.plug, side.sign * layout.spliceOut, layout.up],
      where: high
        ? `Upper deck, ${side.words}, under the rail behind post ${index + 2}; use the deck ladder.`
        : `Lower rail, ${side.words}, inner face, behind post ${index + 1}, hip height.`,
      from,
      handling: high ? 'plugHigh' : 'latch',
    });
    from = plug;
    for (const along of bay.lamps) {
      count += 1;
      const turn = layout.turns.includes(along);
      const tee = `t-${layout.id}-${side.id}-${count}`;
      plan.splice({
        id: tee,
        label: `Tee ${side.letter}${high ? 'U' : 'L'}-${count}`,
        at: [along, side.sign * layout.spliceOut, layout.up],
        where: `Tee splice in the ${layout.words}, ${side.words}, at marker ${count} from the front.`,
        from,
      });
      plan.lamp({
        id: `m-${layout.id}-${side.id}-${count}`,
        label: `${high ? 'Upper' : 'Lower'} marker ${count}${turn ? ' and turn' : ''}, ${side.words}`,
        at: [along, side.sign * layout.lampOut, layout.up],
        where: `Marker ${count} from the front on the ${layout.words}, ${side.words}. ${
          high ? 'Two screws, from the deck ladder.' : 'Grommet.'
        }`,
        from: tee,
        colour: 'amber',
        feeds: { 'side-marker': side.wire, ...(turn && { 'mid-turn': side.turn }) },
        handling: high ? 'screwedHigh' : 'grommet',
      });
      from = tee;
    }
  });
}

/**
 * Car hauler, 53 ft, LED, two decks. Black feeds the road side's markers, brown the curb side's and all tails, the
 * plate and identification.
 */
export function carHauler(): Harness {
  const plan = planBuilder('Car hauler, two decks, markers split by sides', 'led');

  plan.inlet({
    id: 'nose',
    label: 'Nose socket',
    at: [0, 0.2, 1.1],
    where: 'Front frame, right of the centre, waist height.',
  });
  plan.plug({
    id: 'p1',
    label: 'P1 nose plug',
    at: [0.4, 0.1, 1.05],
    where: 'Behind the front frame, right of the centre. Half a turn.',
    from: 'nose',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's1',
    label: 'S1 nose junction',
    at: [0.8, 0, 1],
    where: 'Junction block on the first crossmember, centre.',
    from: 'p1',
    awg: 12,
  });
  for (const side of SIDES) {
    plan.lamp({
      id: `front-clearance-${side.id}`,
      label: `Front clearance, ${side.words}`,
      at: [0.2, side.sign * 1.2, 1.5],
      where: `Front post, ${side.words}, chest height. Two screws.`,
      from: 's1',
      colour: 'amber',
      feeds: { clearance: side.wire },
      handling: 'screwed',
    });
    rail(plan, LOW, side, 's1');
  }

  plan.plug({
    id: 'p2',
    label: 'P2 upper deck plug',
    at: [1.4, 0.3, 1.4],
    where: 'Foot of the second post, right of the centre, where the loom climbs to the upper deck.',
    from: 's1',
    handling: 'latch',
  });
  plan.splice({
    id: 's2',
    label: 'S2 upper deck junction',
    at: [1.6, 0, 2.9],
    where: 'Under the upper deck, behind the second post, junction block.',
    from: 'p2',
  });
  for (const side of SIDES) rail(plan, HIGH, side, 's2');
  lampPair(plan, {
    id: 'deck-clearance',
    label: 'Deck clearance',
    along: 1.5,
    out: 1.15,
    up: 3,
    where: 'front end of the upper deck. Two screws, from the deck ladder.',
    from: 's2',
    colour: 'amber',
    feeds: { clearance: 'markers' },
    handling: 'screwedHigh',
  });

  plan.plug({
    id: 'p3',
    label: 'P3 forward trunk plug',
    at: [4.2, 0, 0.9],
    where: 'Centre of the lower deck, under the first tread plate. Half a turn.',
    from: 's1',
    handling: 'twist',
    awg: 12,
  });
  plan.plug({
    id: 'p4',
    label: 'P4 axle trunk plug',
    at: [9.6, 0, 0.9],
    where: 'Ahead of the axles, centre, under the tread plate. Reach in past the pump lines.',
    from: 'p3',
    handling: 'latchDeep',
    awg: 12,
  });
  plan.splice({
    id: 's3',
    label: 'S3 axle junction',
    at: [10.2, 0, 0.9],
    where: 'Above the front axle, centre, moulded junction.',
    from: 'p4',
    awg: 12,
  });
  plan.plug({
    id: 'p5',
    label: 'P5 ABS plug',
    at: [10.7, 0.4, 0.85],
    where: 'Between the axles, right of the centre, beside the relay valve.',
    from: 's3',
    handling: 'latch',
    awg: 12,
  });
  plan.module({
    id: 'abs-module',
    label: 'ABS module',
    at: [11.3, 0.4, 0.85],
    where: 'Between the axles, bolted to the relay valve.',
    from: 'p5',
    loads: { abs: 0.5, stop: 0.1 },
    awg: 12,
    handling: 'unit',
  });
  plan.plug({
    id: 'p6',
    label: 'P6 rear trunk plug',
    at: [13.7, 0, 0.85],
    where: 'Behind the rear axle, centre, knee height. Half a turn.',
    from: 's3',
    handling: 'twist',
    awg: 12,
  });
  plan.splice({
    id: 's4',
    label: 'S4 rear junction',
    at: [14.4, 0, 0.85],
    where: 'Ahead of the ramp slots, centre, junction block.',
    from: 'p6',
    awg: 12,
  });
  plan.lamp({
    id: 'abs-lamp',
    label: 'ABS lamp',
    at: [15, -1.26, 1.1],
    where: 'Road side, lower rail, ahead of the rear marker, marked ABS. Grommet.',
    from: 's4',
    colour: 'amber',
    feeds: { abs: 'abs' },
    handling: 'grommet',
  });
  for (const side of SIDES) {
    const box = `p-box-${side.id}`;
    plan.plug({
      id: box,
      label: `${side.letter}B rear box plug`,
      at: [15, side.sign * 0.75, 0.85],
      where: `Inner end of the rear lamp box, ${side.words}, knee height.`,
      from: 's4',
      handling: 'latch',
    });
    plan.splice({
      id: `s-box-${side.id}`,
      label: `${side.letter}B rear box splices`,
      at: [15.4, side.sign * 0.75, 0.85],
      where: `Inside the rear lamp box, ${side.words}.`,
      from: box,
    });
    for (const [id, words, along, out] of [
      ['upper', 'upper', 15.75, 0.95],
      ['lower', 'lower', 16, 0.7],
    ] as const) {
      plan.lamp({
        id: `stop-tail-${id}-${side.id}`,
        label: `Stop and tail ${words}, ${side.words}`,
        at: [along, side.sign * out, id === 'upper' ? 1.3 : 0.8],
        where: `Rear lamp box, ${side.words}, the ${words} red lamp. Grommet.`,
        from: `s-box-${side.id}`,
        colour: 'red',
        feeds: { tail: 'tail', stop: 'stop' },
        handling: 'grommet',
      });
    }
    plan.lamp({
      id: `turn-${side.id}`,
      label: `Rear turn, ${side.words}`,
      at: [16.05, side.sign * 1, 1],
      where: `Rear lamp box, ${side.words}, the amber lamp between the red ones. Grommet.`,
      from: `s-box-${side.id}`,
      colour: 'amber',
      feeds: { turn: side.turn },
      handling: 'grommet',
    });
    plan.lamp({
      id: `rear-marker-${side.id}`,
      label: `Rear marker, ${side.words}`,
      at: [15.5, side.sign * 1.26, 1],
      where: `Lower rail, ${side.words}, at the lamp box, facing sideways. Grommet.`,
      from: `s-box-${side.id}`,
      colour: 'red',
      feeds: { 'side-marker': side.wire },
      handling: 'grommet',
    });
    plan.lamp({
      id: `rear-clearance-${side.id}`,
      label: `Rear clearance, ${side.words}`,
      at: [16.05, side.sign * 1.26, 1.5],
      where: `Rear post, ${side.words}, chest height. Two screws.`,
      from: `s-box-${side.id}`,
      colour: 'red',
      feeds: { clearance: side.wire },
      handling: 'screwed',
    });
  }
  plan.plug({
    id: 'p7',
    label: 'P7 rear crossbar plug',
    at: [15, 0.2, 0.85],
    where: 'Behind the rear crossbar, right of the centre. Half a turn.',
    from: 's4',
    handling: 'twist',
  });
  plan.splice({
    id: 's5',
    label: 'S5 crossbar splice',
    at: [15.6, 0, 0.85],
    where: 'Inside the rear crossbar, centre.',
    from: 'p7',
  });
  idLamps(plan, {
    from: 's5',
    along: 16.05,
    up: 1,
    where: 'Rear crossbar, centre. Grommet.',
    wire: 'tail',
    handling: 'grommet',
  });
  plan.lamp({
    id: 'plate',
    label: 'Plate lamp',
    at: [15.8, -0.4, 0.7],
    where: 'Under the rear crossbar, road side, above the plate. Two screws.',
    from: 's5',
    colour: 'white',
    feeds: { plate: 'tail' },
    handling: 'screwed',
  });

  return plan.build();
}
