import type { SectionTree } from '@lampwright/harness';
import { after } from './after';
import { powerUpSeconds } from './costs';
import type { Planner, Question, Timing } from './types';

/** What a trace of one short will take, over all places it may be. */
export interface Forecast {
  expectedSeconds: number;
  worstSeconds: number;
  expectedPowerUps: number;
  /** No order of work can beat this expectation. */
  lowerBoundSeconds: number;
  /** Whether every decision of the play is proven best. */
  proven: boolean;
  /** Share of the places, by probability, that the play ends with when the short is there. */
  foundRate: number;
}

/** A question at the start of a trace: nothing open, every section as likely as the plan says. */
export function firstQuestion(tree: SectionTree, timing: Timing): Question {
  const probabilities = tree.sections.map(({ probability }) => probability);
  return { tree, probabilities, open: [], timing };
}

/**
 * Plays the planner with each section that can be short as the hidden one, to a known section and everything closed.
 * Readings that several sections share are planned once. O(sections) plans.
 */
export function forecast(tree: SectionTree, timing: Timing, planner: Planner): Forecast {
  const first = firstQuestion(tree, timing);
  const outlook: Forecast = {
    expectedSeconds: 0,
    worstSeconds: 0,
    expectedPowerUps: 0,
    lowerBoundSeconds: 0,
    proven: true,
    foundRate: 1,
  };
  const ahead = [{ question: first, share: 1, seconds: 0 }];
  for (let next = ahead.pop(); next; next = ahead.pop()) {
    const { question, share, seconds } = next;
    const plan = planner.plan(question);
    if (plan.kind === 'known') {
      outlook.foundRate -= share * (1 - (question.probabilities[plan.section] ?? 0));
      outlook.expectedSeconds += share * plan.closingSeconds;
      outlook.worstSeconds = Math.max(outlook.worstSeconds, seconds + plan.closingSeconds);
      if (question === first) outlook.lowerBoundSeconds = plan.closingSeconds;
      continue;
    }
    const { open, overloadProbability, proof, lowerBoundSeconds } = plan.advice;
    if (question === first) outlook.lowerBoundSeconds = lowerBoundSeconds;
    outlook.proven &&= proof === 'optimal';
    outlook.expectedPowerUps += share;
    const cost = powerUpSeconds(tree, question.open, open, timing);
    for (const outcome of ['overload', 'holds'] as const) {
      const part = share * (outcome === 'overload' ? overloadProbability : 1 - overloadProbability);
      outlook.expectedSeconds += part * cost[outcome];
      ahead.push({
        question: after(question, open, outcome),
        share: part,
        seconds: seconds + cost[outcome],
      });
    }
  }
  return outlook;
}
