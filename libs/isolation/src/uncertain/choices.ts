import type { PartId } from '@lampwright/harness';
import { walkSeconds } from '../costs';
import { expectedBits } from './information';
import type { Odds } from './Odds';
import { pointsOfHunt, type UsefulPoint } from './points';
import type { Standing } from './standing';

/** A set of points to have open, with what its reading is expected to tell. */
export interface HuntChoice {
  open: PartId[];
  energised: boolean[];
  bits: number;
  /** Bits for each second that it costs, the closing of what it opens included. */
  rate: number;
}

/** At most so many points are opened anew for one power-up. */
const MOST_NEW = 3;

/** Of more points than this only so many, the most telling by a glance, are looked at behind each base. */
const MOST_LOOKED_AT = 64;

/** What costs no time still counts for so many seconds, so that rates can be compared. */
const SHORTEST = 1e-6;

/**
 * The power-up that tells the most bits a second; `null` where none tells anything. What is open may stay open or be
 * closed, points are opened as long as that raises the rate, and to read the same again costs no handling at all.
 * O(bases x points x (sections + terms)).
 */
export function bestChoice(standing: Standing, odds: Odds): HuntChoice | null {
  const chooser = new Chooser(standing, odds);
  let best: HuntChoice | null = null;
  const offer = (choice: HuntChoice | null): boolean => {
    if (!choice || (best && choice.rate <= best.rate)) return false;
    best = choice;
    return true;
  };
  for (const base of chooser.bases()) {
    offer(chooser.choice(base));
    let at = base;
    for (let more = 0; more < MOST_NEW; more += 1) {
      const next = chooser.extended(at);
      if (!next || !offer(next.choice)) break;
      at = next.open;
    }
  }
  return best;
}

class Chooser {
  private readonly useful: UsefulPoint[];
  private readonly blockingWalk: number;
  private readonly isUseful: Set<PartId>;
  private readonly stays: PartId[];

  constructor(
    private readonly standing: Standing,
    private readonly odds: Odds,
  ) {
    const { hunt } = standing;
    const { useful, blocking } = pointsOfHunt(standing);
    this.useful = useful;
    this.blockingWalk = blocking.reduce(
      (most, each) => Math.max(most, walkSeconds(each, hunt.timing)),
      0,
    );
    this.isUseful = new Set(useful.map(({ point }) => point.partId));
    const blocks = new Set(blocking.map(({ partId }) => partId));
    this.stays = hunt.open.filter((id) => !this.isUseful.has(id) && !blocks.has(id));
  }

  /** Which of the useful open points stay open: none, all, all but one, only one. */
  bases(): UsefulPoint[][] {
    const open = this.useful.filter(({ isOpen }) => isOpen);
    if (open.length === 0) return [[]];
    const bases = [[], open];
    if (open.length > 1) bases.push(...open.map((one) => open.filter((other) => other !== one)));
    if (open.length > 2) bases.push(...open.map((one) => [one]));
    return bases;
  }

  choice(open: readonly UsefulPoint[]): HuntChoice | null {
    const { hunt, detection, tree } = this.standing;
    const parted = new Set(open.map(({ section }) => section));
    const stay = new Set(this.stays);
    const energised: boolean[] = [];
    for (const { index, parent, point } of tree.sections) {
      const fed = parent === null || energised[parent] === true;
      energised.push(fed && !parted.has(index) && !(point && stay.has(point.partId)));
    }
    const { lit, bits } = this.odds.outlook(energised);
    if (bits <= 0) return null;
    const seconds = this.seconds(open) + lit * detection * hunt.timing.overloadSeconds;
    const ids = [...this.stays, ...open.map(({ point }) => point.partId)];
    return { open: ids, energised, bits, rate: bits / Math.max(seconds, SHORTEST) };
  }

  /** The best one further point on top. */
  extended(base: readonly UsefulPoint[]): { open: UsefulPoint[]; choice: HuntChoice } | null {
    let best: { open: UsefulPoint[]; choice: HuntChoice } | null = null;
    for (const further of this.shortlist(base)) {
      const open = [...base, further];
      const choice = this.choice(open);
      if (choice && (!best || choice.rate > best.choice.rate)) best = { open, choice };
    }
    return best;
  }

  private seconds(open: readonly UsefulPoint[]): number {
    let hands = 0;
    let walk = this.blockingWalk;
    const kept = new Set(open);
    for (const each of open) {
      if (each.isOpen) continue;
      hands += each.hands;
      walk = Math.max(walk, each.walk);
    }
    for (const each of this.useful) {
      if (each.isOpen && !kept.has(each)) walk = Math.max(walk, each.walk);
    }
    return this.standing.hunt.timing.powerSeconds + hands + walk;
  }

  private shortlist(base: readonly UsefulPoint[]): readonly UsefulPoint[] {
    const others = this.useful.filter((each) => !each.isOpen && !base.includes(each));
    if (others.length <= MOST_LOOKED_AT) return others;
    const { belief, tree, detection } = this.standing;
    const parted = new Set(base.map(({ section }) => section));
    const beyond = [...belief.probabilities];
    for (const { index, parent } of tree.sections.toReversed()) {
      if (parent === null || parted.has(index)) continue;
      beyond[parent] = (beyond[parent] ?? 0) + (beyond[index] ?? 0);
    }
    const total = belief.probabilities.reduce((sum, each) => sum + each, 0);
    const all = beyond[0] ?? 0;
    const rate = ({ section, hands }: UsefulPoint) => {
      const lit = (all - (beyond[section] ?? 0)) / Math.max(1, total);
      return expectedBits(Math.min(1, Math.max(0, lit)), detection) / (hands + 1);
    };
    return others
      .map((each) => ({ each, rate: rate(each) }))
      .sort((a, b) => b.rate - a.rate)
      .slice(0, MOST_LOOKED_AT)
      .map(({ each }) => each);
  }
}
