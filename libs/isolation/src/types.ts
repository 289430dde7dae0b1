import type { PartId, SectionTree, SeparablePoint } from '@lampwright/harness';

/** The shop's times, all in seconds but `powerAlong` (metres) and `walkSecondsPerMetre`. */
export interface Timing {
  /** One power-up, from standing at the switch to a reading. */
  powerSeconds: number;
  /** 0 where the power is switched from where the person works. */
  walkSecondsPerMetre: number;
  /** Where the power is switched, in metres from the front. */
  powerAlong: number;
  /** What an overload costs on top: a breaker that cools, a fuse to replace. */
  overloadSeconds: number;
}

export type Outcome = 'overload' | 'holds';

/** What one power-up showed, with `open` the separable parts that were open. */
export interface Reading {
  open: readonly PartId[];
  outcome: Outcome;
}

/** How the belief is formed. */
export interface BeliefOptions {
  /** Probability that an energised short shows in one power-up; 1 for a short that always shows. Default 1. */
  detection?: number;
  /** The most shorts that may be there at once: 1, 2 or 3. Default 1. */
  maxFaults?: number;
}

/** What is known of one circuit after some readings. */
export interface Belief {
  /** By section index: the probability that the section holds a short. With one short they sum to 1. */
  probabilities: number[];
  /** Indices of the sections with a probability above 0, most likely first. */
  inQuestion: number[];
  /** True when no set of shorts within the options explains the readings; then all probabilities are 0. */
  contradicted: boolean;
}

/** What the planner is asked: where things stand before the next power-up. */
export interface Question {
  tree: SectionTree;
  /** By section index, summing to 1. */
  probabilities: readonly number[];
  /** The separable parts that are open now, also those of other circuits. */
  open: readonly PartId[];
  timing: Timing;
  /**
   * The open points of other circuits, with their times. They do not matter to this circuit, so they stay as they are
   * until everything is closed at the end, which they make longer. An open id that is neither here nor in the tree
   * stays open too, but costs nothing.
   */
  elsewhere?: readonly SeparablePoint[];
  /**
   * The points that were open at the last power-up; `open` where nothing was touched since. A power-up that would
   * energise the very same sections again is not proposed.
   */
  poweredWith?: readonly PartId[];
}

/** How far the planner vouches for an advice. */
export type Proof = 'optimal' | 'optimalInClass' | 'notProven';

/** One proposed power-up, in facts and figures. */
export interface Advice {
  /** The whole set of points to have open when power goes on. */
  open: PartId[];
  toOpen: PartId[];
  toClose: PartId[];
  /** Sections that would be energised. */
  energised: number[];
  /** Probability of an overload. */
  overloadProbability: number;
  /** Seconds of this power-up, by its outcome. */
  seconds: Record<Outcome, number>;
  /** Expected seconds from now until the section is known and everything is closed again, under the planner's own play. */
  expectedSeconds: number;
  /** The longest that play can take. */
  worstSeconds: number;
  /** No order of work can beat this expectation. */
  lowerBoundSeconds: number;
  proof: Proof;
}

/** The next power-up, or `known` when one section is left and only closing remains. */
export type Plan =
  { kind: 'powerUp'; advice: Advice } | { kind: 'known'; section: number; closingSeconds: number };

/** Chooses the next power-up. Pure: the same question gives the same plan. */
export interface Planner {
  plan(question: Question): Plan;
}

/** A short that was found and mended. */
export interface Mended {
  section: number;
  /** How many of the hunt's readings were taken before it was mended. */
  after: number;
  /** How likely the section is to hold another short, as a share of what it was. Default 0. */
  again?: number;
}

/** What a planner is asked where readings may miss a short or several shorts may be there. */
export interface Hunt {
  /** With the probabilities from before the first reading. */
  tree: SectionTree;
  /** All readings of the circuit, oldest first; also those from before a repair. */
  readings: readonly Reading[];
  options: BeliefOptions;
  /** The separable parts that are open now, also those of other circuits. */
  open: readonly PartId[];
  timing: Timing;
  /** As in `Question`. */
  elsewhere?: readonly SeparablePoint[];
  mended?: readonly Mended[];
  /** Sections that were looked over and hold no short. */
  lookedOver?: readonly number[];
  /** Points that can no longer be moved; readings with them open still count. */
  barred?: readonly PartId[];
  /** From this probability on a section counts as found, and the circuit as clear. See `stopsAt`. */
  confidence?: number;
}

/** One proposed power-up of a hunt, in facts and figures. */
export interface HuntAdvice {
  /** `prove`: everything closed after a repair, to see whether another short is left. */
  purpose: 'narrow' | 'prove';
  open: PartId[];
  toOpen: PartId[];
  toClose: PartId[];
  /** Sections that would be energised. */
  energised: number[];
  overloadProbability: number;
  /** Seconds of this power-up, by its outcome. */
  seconds: Record<Outcome, number>;
  /** What the reading is expected to tell. */
  bits: number;
  /** `optimal` only with one short that always shows. */
  proof: Proof;
  /** True where the same sections held before: to be read again, this time with the harness moved by hand. */
  repeats: boolean;
  /** What would be named now, most likely first: one section, or several that barred points join. */
  likeliest: { sections: number[]; probability: number };
  /** The probability at which it counts as found. */
  stopsAt: number;
}

/** What comes next in a hunt. */
export type HuntPlan =
  | { kind: 'powerUp'; advice: HuntAdvice }
  /** A section holds a short, with this probability; one of several, most likely first, where barred points join them. */
  | {
      kind: 'found';
      sections: number[];
      confidence: number;
      stopsAt: number;
      closingSeconds: number;
    }
  /** No short is left, with this probability; only ever after a repair. */
  | { kind: 'clear'; confidence: number; stopsAt: number; closingSeconds: number }
  /** No set of shorts within the options explains the readings. */
  | { kind: 'contradicted' };

/** Chooses the next power-up of a hunt. Pure: the same hunt gives the same plan. */
export interface HuntPlanner {
  plan(hunt: Hunt): HuntPlan;
}
