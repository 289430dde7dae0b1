import type { LampColour, LampTechnology, PartId } from '@lampwright/harness';
import type { PlanBuilder } from './builder';
import type { Wire } from './circuits';
import type { Handling } from './handling';
import type { Feeds } from './lampLoads';
import type { LampFunction } from './lampAmps';
import type { Feeder } from './nodes';

/** `turn` stands for the turn circuit of the lamp's own side. */
type SideFeeds = Partial<Record<LampFunction, Wire | 'turn'>>;

export interface LampPair {
  id: PartId;
  /** The side is added to it. */
  label: string;
  along: number;
  /** From the centre line to each lamp; not negative. */
  out: number;
  up: number;
  /** Goes on after "Road side" or "Curb side". */
  where: string;
  /** One feeder for both, or the road side's and the curb side's. */
  from: Feeder | readonly [road: Feeder, curb: Feeder];
  colour: LampColour;
  feeds: SideFeeds;
  handling?: Handling;
  technology?: LampTechnology;
  awg?: number;
}

const SIDES = [
  { id: 'road', words: 'Road side', sign: -1, turn: 'left' },
  { id: 'curb', words: 'Curb side', sign: 1, turn: 'right' },
] as const;

function isEach(from: LampPair['from']): from is readonly [Feeder, Feeder] {
  return Array.isArray(from);
}

function feedsOf(feeds: SideFeeds, turn: Wire): Feeds {
  return Object.fromEntries(
    Object.entries(feeds).map(([name, wire]) => [name, wire === 'turn' ? turn : wire]),
  );
}

/** Two like lamps, one on each side: `<id>-road` and `<id>-curb`. */
export function lampPair(plan: PlanBuilder, pair: LampPair): void {
  const { id, label, along, out, up, where, from, feeds, ...rest } = pair;
  SIDES.forEach((side, index) => {
    plan.lamp({
      ...rest,
      id: `${id}-${side.id}`,
      label: `${label}, ${side.words.toLowerCase()}`,
      at: [along, side.sign * out, up],
      where: `${side.words}, ${where}`,
      from: isEach(from) ? (from[index] as Feeder) : from,
      feeds: feedsOf(feeds, side.turn),
    });
  });
}

export interface IdLamps {
  from: Feeder;
  along: number;
  up: number;
  where: string;
  wire: Wire;
  handling?: Handling;
}

/** The three red identification lamps, 0.3 m apart about the centre line (49 CFR 393.11; spacing FMVSS 108). */
export function idLamps(plan: PlanBuilder, group: IdLamps): void {
  const { wire, along, up, where, ...rest } = group;
  for (const [id, words, across] of [
    ['road', 'road side', -0.3],
    ['centre', 'centre', 0],
    ['curb', 'curb side', 0.3],
  ] as const) {
    plan.lamp({
      ...rest,
      id: `id-${id}`,
      label: `ID lamp, ${words}`,
      at: [along, across, up],
      where: `${where} The ${id === 'centre' ? 'middle' : words} one of three.`,
      colour: 'red',
      feeds: { identification: wire },
    });
  }
}
