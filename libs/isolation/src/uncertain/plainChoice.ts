import { energisedSections, type PartId, type SeparablePoint } from '@lampwright/harness';
import { pointsOf } from '../costs';
import type { Planner, Proof, Question } from '../types';
import { expectedBits } from './information';
import { joined } from './joined';
import type { Odds } from './Odds';
import type { Standing } from './standing';
import { targetOf } from './target';

/**
 * From this share on the hunted short is taken to be where nothing has held yet: one reading that held at 0.98 may lie
 * behind it. Tried on the case plans at 0.8 to 1: lower took longer, and without it two shorts did by up to half.
 */
const TRUSTED = 0.98;

/** A power-up must tell at least this share of what it would tell if the hunted short were the only one. */
const TELLING = 0.5;

/**
 * The points that a planner of one short that always shows would have open, as long as its view is a good one: readings
 * that held are very likely to be right, so that the hunted short is where nothing has held yet. `null` where that is
 * not so, and where its hunt is over.
 */
export function plainChoice(
  standing: Standing,
  odds: Odds,
  planner: Planner,
): { open: PartId[]; proof: Proof } | null {
  const { hunt, tree, readings } = standing;
  const { barred = [] } = hunt;
  const isOpen = new Set(hunt.open);
  // Beyond a point that stays open for good nothing can be told any more; that view has no plain one.
  if (barred.some((id) => isOpen.has(id))) return null;
  const { shares, within } = targetOf(standing);
  const held = readings.filter(({ outcome }) => outcome === 'holds');
  const hasHeld = held.map((reading) => energisedSections(tree, reading.open));
  const left = shares.map((share, at) => (hasHeld.some((lit) => lit[at]) ? 0 : share));
  const trust = left.reduce((sum, each) => sum + each, 0);
  if (trust < TRUSTED) return null;
  // What keeps other shorts dark stays open, as points of other circuits do.
  const kept = new Set(within?.open);
  const pinned = pointsOf(tree).filter(({ partId }) => kept.has(partId) && isOpen.has(partId));
  const question = questionOf(standing, left, pinned);
  const plan = planner.plan(question);
  if (plan.kind === 'known') return null;
  const { open, overloadProbability, proof } = plan.advice;
  const { bits } = odds.outlook(energisedSections(tree, open));
  const wanted = TELLING * expectedBits(overloadProbability, standing.detection);
  if (bits < wanted) return null;
  const same = standing.detection === 1 && !standing.several;
  return { open, proof: same ? proof : 'notProven' };
}

function questionOf(
  { hunt, tree, readings }: Standing,
  left: readonly number[],
  pinned: readonly SeparablePoint[],
): Question {
  const fixed = new Set([...(hunt.barred ?? []), ...pinned.map(({ partId }) => partId)]);
  const plain = joined(tree, fixed);
  const probabilities = plain.tree.sections.map(() => 0);
  left.forEach((share, at) => {
    const to = plain.home[at] ?? 0;
    probabilities[to] = (probabilities[to] ?? 0) + share;
  });
  const { open, timing } = hunt;
  const elsewhere = [...(hunt.elsewhere ?? []), ...pinned];
  const poweredWith = readings.at(-1)?.open ?? open;
  return { tree: plain.tree, probabilities, open, timing, elsewhere, poweredWith };
}
