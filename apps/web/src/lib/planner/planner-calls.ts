import type { PartId, SectionTree } from '@lampwright/harness';
import {
  adviceFor,
  createPlanner,
  easiestFirstSeconds,
  firstQuestion,
  forecast,
  halfByCountSeconds,
  type Advice,
  type Forecast,
  type Plan,
  type Question,
  type Timing,
} from '@lampwright/isolation';

/** A forecast beside what the usual habits would take on the same circuit, in seconds. */
export interface CircuitForecast extends Forecast {
  easiestFirstSeconds: number;
  halfByCountSeconds: number;
}

/** What the planner is asked for, by name. */
interface Arguments {
  plan: [question: Question, steps: number];
  adviceFor: [question: Question, open: readonly PartId[]];
  forecast: [tree: SectionTree, timing: Timing, steps: number];
}

interface Answers {
  plan: Plan;
  adviceFor: Advice;
  forecast: CircuitForecast;
}

export type PlannerCall = keyof Arguments;
export type PlannerArguments<Name extends PlannerCall> = Arguments[Name];
export type PlannerAnswer<Name extends PlannerCall> = Answers[Name];

/** The door to the planner: a call by its name and arguments, answered when it is worked out. */
export interface PlannerClient {
  ask<Name extends PlannerCall>(
    name: Name,
    ...args: PlannerArguments<Name>
  ): Promise<PlannerAnswer<Name>>;
}

const calls: {
  [Name in PlannerCall]: (...args: PlannerArguments<Name>) => PlannerAnswer<Name>;
} = {
  plan: (question, steps) => createPlanner({ steps }).plan(question),
  adviceFor: (question, open) => adviceFor(question, open),
  forecast: (tree, timing, steps) => {
    const question = firstQuestion(tree, timing);
    return {
      ...forecast(tree, timing, createPlanner({ steps })),
      easiestFirstSeconds: easiestFirstSeconds(question),
      halfByCountSeconds: halfByCountSeconds(question),
    };
  },
};

/** Works a call out here and now. */
export function answerCall<Name extends PlannerCall>(
  name: Name,
  args: PlannerArguments<Name>,
): PlannerAnswer<Name> {
  return calls[name](...args);
}
