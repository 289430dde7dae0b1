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
  type Question,
  type Timing,
} from '@lampwright/isolation';

/** A forecast beside what the usual habits would take on the same circuit, in seconds. */
export interface CircuitForecast extends Forecast {
  easiestFirstSeconds: number;
  halfByCountSeconds: number;
}

/** A plan in the terms of a screen. */
export interface Advised {
  /** `null` when one section is left. */
  advice: Advice | null;
  /** Expected seconds from here of unplugging whatever is easiest, one by one. */
  easiestFirstSeconds: number;
}

/** What the planner is asked for, by name. `steps` is how long it may think. */
interface Arguments {
  advise: [question: Question, steps: number];
  adviceFor: [question: Question, open: readonly PartId[], steps: number];
  forecast: [tree: SectionTree, timing: Timing, steps: number];
}

interface Answers {
  advise: Advised;
  adviceFor: Advice;
  forecast: CircuitForecast;
}

export type PlannerCall = keyof Arguments;
export type PlannerArguments<Name extends PlannerCall> = Arguments[Name];
export type PlannerAnswer<Name extends PlannerCall> = Answers[Name];

export interface AskOptions {
  /** Nobody waits for it: it may not hold up what somebody waits for. Default false. */
  background?: boolean;
  /** Once aborted, the call rejects with its reason. */
  signal?: AbortSignal;
}

/** The door to the planner: a call by its name and arguments, answered when it is worked out. */
export interface PlannerClient {
  ask<Name extends PlannerCall>(
    name: Name,
    args: PlannerArguments<Name>,
    options?: AskOptions,
  ): Promise<PlannerAnswer<Name>>;
  /** Makes ready to be asked while there still is a signal to fetch the worker over. */
  warm(): void;
}

const calls: {
  [Name in PlannerCall]: (...args: PlannerArguments<Name>) => PlannerAnswer<Name>;
} = {
  advise: (question, steps) => {
    const plan = createPlanner({ steps }).plan(question);
    return {
      advice: plan.kind === 'powerUp' ? plan.advice : null,
      easiestFirstSeconds: easiestFirstSeconds(question),
    };
  },
  adviceFor: (question, open, steps) => adviceFor(question, open, createPlanner({ steps })),
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
