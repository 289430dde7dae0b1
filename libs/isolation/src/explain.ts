import { energisedSections } from '@lampwright/harness';
import { cellsOf } from './cells';
import { closingSeconds } from './costs';
import { easiestFirstSeconds, halfByCountSeconds } from './habits';
import { alternativesTo, type Alternative } from './alternatives';
import type { Advice, Outcome, Plan, Question } from './types';

/** What one reading would leave. */
export interface Aftermath {
  probability: number;
  /** Seconds of this power-up when it reads so. */
  seconds: number;
  /** Sections still in question, and how many places they hold. */
  sections: number[];
  places: number;
  /** Seconds of closing all that would then be open. */
  closingSeconds: number;
}

/** The figures behind a proposed power-up. */
export interface PowerUpFacts {
  kind: 'powerUp';
  /** Sections in question now, and how many places they hold. */
  sections: number[];
  places: number;
  after: Record<Outcome, Aftermath>;
  /** The two best that open other points, best first; fewer where there are no others. */
  alternatives: Alternative[];
  /** Expected seconds of the usual habits from here. */
  easiestFirstSeconds: number;
  halfByCountSeconds: number;
}

/** Nothing to choose any more: one section is left. */
export interface KnownFacts {
  kind: 'known';
  section: number;
  places: number;
  closingSeconds: number;
}

export type Explanation = PowerUpFacts | KnownFacts;

/** Facts and figures of a plan for the question it answers. About the time of one plan. */
export function explain(question: Question, plan: Plan): Explanation {
  if (plan.kind === 'known') {
    const { section, closingSeconds } = plan;
    return { kind: 'known', section, places: placesIn(question, [section]), closingSeconds };
  }
  const { advice } = plan;
  const sections = inQuestion(question, () => true);
  return {
    kind: 'powerUp',
    sections,
    places: placesIn(question, sections),
    after: {
      overload: aftermath(question, advice, 'overload'),
      holds: aftermath(question, advice, 'holds'),
    },
    alternatives: alternativesTo(question, cellsOf(question), advice, 2),
    easiestFirstSeconds: easiestFirstSeconds(question),
    halfByCountSeconds: halfByCountSeconds(question),
  };
}

function aftermath(question: Question, advice: Advice, outcome: Outcome): Aftermath {
  const { tree, timing, elsewhere } = question;
  const energised = energisedSections(tree, advice.open);
  const sections = inQuestion(question, (at) => energised[at] === (outcome === 'overload'));
  const overload = advice.overloadProbability;
  return {
    probability: outcome === 'overload' ? overload : 1 - overload,
    seconds: advice.seconds[outcome],
    sections,
    places: placesIn(question, sections),
    closingSeconds: closingSeconds(tree, advice.open, timing, elsewhere),
  };
}

function inQuestion({ probabilities }: Question, where: (section: number) => boolean): number[] {
  return [...probabilities.keys()].filter((at) => (probabilities[at] ?? 0) > 0 && where(at));
}

function placesIn({ tree }: Question, sections: readonly number[]): number {
  return sections.reduce((sum, at) => sum + (tree.sections[at]?.places.length ?? 0), 0);
}
