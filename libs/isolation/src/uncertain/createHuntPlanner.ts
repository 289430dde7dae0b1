import { energisedSections } from '@lampwright/harness';
import { closingSeconds, pointsOf, powerUpSeconds } from '../costs';
import { createPlanner, type PlannerOptions } from '../planner';
import type { Hunt, HuntAdvice, HuntPlan, HuntPlanner, Planner } from '../types';
import { bestChoice } from './choices';
import { expectedBits } from './information';
import { likeliest } from './likeliest';
import { Odds } from './Odds';
import { plainChoice } from './plainChoice';
import { standingOf, type Standing } from './standing';

/**
 * A planner for hunts in which readings may miss a short or several shorts may be there. As long as readings that held
 * can be trusted it hunts one of them as the planner of one short that always shows would, with the others kept dark;
 * otherwise each power-up is the one that tells the most bits a second, which may be the last one over again. A section
 * counts as found at the hunt's confidence. After a repair everything is closed and powered until an overload says that
 * another short is left, or enough readings that none is.
 */
export function createHuntPlanner(options: PlannerOptions = {}): HuntPlanner {
  return huntPlannerFrom(createPlanner(options));
}

/** The same with any planner of one short that always shows in the place of the library's own. */
export function huntPlannerFrom(plain: Planner): HuntPlanner {
  return { plan: (hunt) => planHunt(hunt, plain) };
}

function planHunt(hunt: Hunt, plain: Planner): HuntPlan {
  const standing = standingOf(hunt);
  const { belief, noneLeft, stopsAt } = standing;
  // Who believes in a single short has found it; anyone else sees the circuit hold once more.
  const single = (hunt.options.maxFaults ?? 1) === 1;
  if (noneLeft >= stopsAt && (single || standing.proven)) {
    return { kind: 'clear', confidence: noneLeft, ...ending(standing) };
  }
  if (noneLeft > 0) return { kind: 'powerUp', advice: proving(standing) };
  if (belief.contradicted) return { kind: 'contradicted' };
  const odds = new Odds(standing);
  const { sections, probability } = likeliest(standing, odds);
  const choice =
    probability >= stopsAt
      ? null
      : (plainChoice(standing, odds, plain) ?? bestChoice(standing, odds));
  if (!choice) return { kind: 'found', sections, confidence: probability, ...ending(standing) };
  const { open } = choice;
  const proof = 'proof' in choice ? choice.proof : 'notProven';
  return { kind: 'powerUp', advice: { ...adviceOf(standing, open, odds), proof } };
}

function ending({ hunt, stopsAt }: Standing): { stopsAt: number; closingSeconds: number } {
  const { tree, open, timing, elsewhere } = hunt;
  return { stopsAt, closingSeconds: closingSeconds(tree, open, timing, elsewhere) };
}

/** Everything of this circuit closed, but for what nobody can close. */
function proving(standing: Standing): HuntAdvice {
  const { tree, open, barred } = standing.hunt;
  const closes = new Set(pointsOf(tree).map(({ partId }) => partId));
  for (const id of barred ?? []) closes.delete(id);
  const left = open.filter((id) => !closes.has(id));
  return { ...adviceOf(standing, left, new Odds(standing)), purpose: 'prove' };
}

function adviceOf(standing: Standing, open: readonly string[], odds: Odds): HuntAdvice {
  const { hunt, detection, noneLeft, readings, stopsAt } = standing;
  const { tree, timing, elsewhere } = hunt;
  const energised = energisedSections(tree, open);
  const outlook = odds.outlook(energised);
  const lit = (1 - noneLeft) * outlook.lit;
  const before = new Set(hunt.open);
  const wanted = new Set(open);
  const { sections, probability } = likeliest(standing, odds);
  return {
    purpose: 'narrow',
    proof: 'notProven',
    open: [...open],
    toOpen: open.filter((id) => !before.has(id)),
    toClose: hunt.open.filter((id) => !wanted.has(id)),
    energised: energised.flatMap((on, index) => (on ? [index] : [])),
    overloadProbability: lit * detection,
    seconds: powerUpSeconds(tree, hunt.open, open, timing, elsewhere),
    bits: noneLeft > 0 ? expectedBits(lit, detection) : outlook.bits,
    repeats: readings.some(
      (reading) =>
        reading.outcome === 'holds' &&
        energisedSections(tree, reading.open).every((on, index) => on === energised[index]),
    ),
    likeliest: { sections, probability: (1 - noneLeft) * probability },
    stopsAt,
  };
}
