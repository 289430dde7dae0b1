import type { SeparablePoint } from '@lampwright/harness';
import { bitsPerSecond } from './capacity';
import { pointsOf, walkSeconds } from './costs';
import type { Question } from './types';
import { worthKeeping } from './worthKeeping';

/**
 * A question boiled down to what still matters: cells are runs of sections that no useful point parts, joined in a tree
 * by the points that have something in question on both sides. Cell 0 is fed first and parents come before children;
 * `v` names a cell and, above 0, the point that joins it to its parent.
 *
 * Every point that is opened is closed again once, whenever that is, so `hands` charges both at the opening and
 * `closing` is what the points open now will cost at some time whatever happens. Walks cannot be charged in advance.
 */
export interface Cells {
  size: number;
  parent: Int32Array;
  /** Probability of a short, by cell; they sum to 1. */
  weight: Float64Array;
  /** Seconds of opening and closing the point once. */
  hands: Float64Array;
  /** Seconds of walking from the switch to the point and back. */
  walk: Float64Array;
  points: (SeparablePoint | null)[];
  /** The most likely section in question of each cell, or -1. */
  section: Int32Array;
  powerSeconds: number;
  overloadSeconds: number;
  /** See `bitsPerSecond`; walks not counted. */
  bitsPerSecond: number;
  /** Close seconds of everything that is open at the start. */
  closing: number;
  /** Walk to the farthest open point of other circuits. */
  elsewhere: number;
  /** Cells whose point is open at the start. */
  open: number[];
  /** Open points between the inlet and everything in question: each power-up that is to show anything closes them. */
  blocking: SeparablePoint[];
  /** Open points with nothing in question beyond them. */
  spent: SeparablePoint[];
  /** Walk to the farthest of each. */
  blockingWalk: number;
  spentWalk: number;
}

/**
 * Boils a question down. Of points that part the very same sections, those are left out that take no less handling and
 * no less walking than another; open points stay. O(sections).
 */
export function cellsOf(question: Question): Cells {
  const { tree, timing } = question;
  const { sections } = tree;
  const sum = question.probabilities.reduce((total, each) => total + each, 0);
  if (!(sum > 0)) throw new RangeError('a question needs a section with a probability above 0');
  const probability = sections.map(({ index }) => (question.probabilities[index] ?? 0) / sum);
  const open = new Set(question.open);
  const elsewhere = (question.elsewhere ?? []).filter(({ partId }) => open.has(partId));
  const beyond = countBeyond(question, probability);
  const all = beyond[0] ?? 0;

  const blocking: SeparablePoint[] = [];
  const spent: SeparablePoint[] = [];
  const useful = new Set<number>();
  for (const { index, point } of sections) {
    if (!point) continue;
    const count = beyond[index] ?? 0;
    if (count > 0 && count < all) useful.add(index);
    else if (open.has(point.partId)) (count === 0 ? spent : blocking).push(point);
  }
  const kept = worthKeeping(question, useful, beyond, open);

  const cellOf = new Int32Array(sections.length);
  const parent: number[] = [-1];
  const points: (SeparablePoint | null)[] = [null];
  for (const { index, parent: up, point } of sections) {
    const above = up === null ? 0 : (cellOf[up] ?? 0);
    cellOf[index] = kept.has(index) ? parent.length : above;
    if (!kept.has(index)) continue;
    parent.push(above);
    points.push(point);
  }

  const farthest = (some: readonly SeparablePoint[]) =>
    some.reduce((most, point) => Math.max(most, walkSeconds(point, timing)), 0);
  const size = parent.length;
  const weight = new Float64Array(size);
  const section = new Int32Array(size).fill(-1);
  probability.forEach((share, index) => {
    const cell = cellOf[index] ?? 0;
    weight[cell] = (weight[cell] ?? 0) + share;
    const leader = section[cell] ?? -1;
    if (share > 0 && (leader < 0 || share > (probability[leader] ?? 0))) section[cell] = index;
  });
  return {
    size,
    parent: Int32Array.from(parent),
    weight,
    hands: Float64Array.from(points, (point) =>
      point ? point.openSeconds + point.closeSeconds : 0,
    ),
    walk: Float64Array.from(points, (point) => (point ? walkSeconds(point, timing) : 0)),
    points,
    section,
    powerSeconds: timing.powerSeconds,
    overloadSeconds: timing.overloadSeconds,
    bitsPerSecond: bitsPerSecond(timing.powerSeconds, timing.powerSeconds + timing.overloadSeconds),
    closing: [...pointsOf(tree).filter(({ partId }) => open.has(partId)), ...elsewhere].reduce(
      (total, { closeSeconds }) => total + closeSeconds,
      0,
    ),
    elsewhere: farthest(elsewhere),
    open: points.flatMap((point, cell) => (point && open.has(point.partId) ? [cell] : [])),
    blocking,
    spent,
    blockingWalk: farthest(blocking),
    spentWalk: farthest(spent),
  };
}

/** By section: how many sections in question are fed through it, itself included. */
function countBeyond({ tree }: Question, probability: readonly number[]): number[] {
  const beyond = probability.map((share) => (share > 0 ? 1 : 0) as number);
  for (const { index, parent } of tree.sections.toReversed()) {
    if (parent !== null) beyond[parent] = (beyond[parent] ?? 0) + (beyond[index] ?? 0);
  }
  return beyond;
}
