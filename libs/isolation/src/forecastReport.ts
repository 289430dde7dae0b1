import type { SectionTree } from '@lampwright/harness';
import { firstQuestion, forecast } from './forecast';
import { calibrationOf, decilesOf, type Calibration } from './forecastDeciles';
import { forecastSamples, type SampleOptions } from './forecastSamples';
import { habitPlanner } from './play/habitPlanner';
import { easiestFirst, easiestFirstSeconds, halfByCount, halfByCountSeconds } from './habits';
import { createPlanner, type PlannerOptions } from './planner';
import type { Policy } from './playOut';
import { timed } from './play/timed';
import type { Timing } from './types';
import { createHuntPlanner, huntPlannerFrom } from './uncertain/createHuntPlanner';

/** What to forecast; without `hunt` one short that always shows, in each section in turn. */
export interface ReportOptions {
  timing: Timing;
  planner?: PlannerOptions;
  /** Several shorts, or readings that may miss: random traces. */
  hunt?: SampleOptions;
  /** Milliseconds, for the decision times. */
  clock: () => number;
}

/** A forecast with all that is told of it. */
export interface ForecastReport {
  sections: number;
  expectedSeconds: number;
  worstSeconds: number;
  expectedPowerUps: number;
  lowerBoundSeconds: number;
  /** Whether every decision was optimal. */
  proven: boolean;
  /** Share of the traces in which every short was found. */
  foundRate: number;
  /** Over all sections that were named: how sure, and how often rightly. */
  confidence: { stated: number; actual: number };
  /** Expected seconds of the usual habits, on the same traces; `null` where readings may miss, which habits have no rule for. */
  habits: { easiestFirstSeconds: number | null; halfByCountSeconds: number | null };
  decisionMilliseconds: { median: number; p95: number; max: number };
  /** `confidence` in ten groups of namings, the least sure first; for random traces. */
  deciles: Calibration[];
}

/** Plays a planner against a circuit. O(sections) or O(samples x power-ups) plans. */
export function forecastReport(tree: SectionTree, options: ReportOptions): ForecastReport {
  const { timing, planner = {}, hunt, clock } = options;
  const sections = tree.sections.length;
  if (!hunt) {
    const plain = timed(createPlanner(planner), clock);
    const question = firstQuestion(tree, timing);
    const outlook = forecast(tree, timing, plain);
    return {
      sections,
      ...outlook,
      // A planner of one short that always shows says nothing before it is certain.
      confidence: { stated: 1, actual: outlook.foundRate },
      habits: {
        easiestFirstSeconds: easiestFirstSeconds(question),
        halfByCountSeconds: halfByCountSeconds(question),
      },
      decisionMilliseconds: spread(plain.took),
      deciles: [],
    };
  }
  const hunter = timed(createHuntPlanner(planner), clock);
  const { namings, ...figures } = forecastSamples(tree, timing, hunter, hunt);
  const { stated, actual } = calibrationOf(namings);
  return {
    sections,
    ...figures,
    confidence: { stated, actual },
    habits: habitsOn(tree, timing, hunt),
    decisionMilliseconds: spread(hunter.took),
    deciles: decilesOf(namings),
  };
}

function habitsOn(
  tree: SectionTree,
  timing: Timing,
  hunt: SampleOptions,
): ForecastReport['habits'] {
  if ((hunt.detection ?? 1) < 1) return { easiestFirstSeconds: null, halfByCountSeconds: null };
  const seconds = (habit: Policy) =>
    forecastSamples(tree, timing, huntPlannerFrom(habitPlanner(habit)), hunt).expectedSeconds;
  return { easiestFirstSeconds: seconds(easiestFirst), halfByCountSeconds: seconds(halfByCount) };
}

function spread(took: readonly number[]): ForecastReport['decisionMilliseconds'] {
  const sorted = [...took].sort((a, b) => a - b);
  const at = (share: number) =>
    sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0;
  return { median: at(0.5), p95: at(0.95), max: at(1) };
}
