import type { Naming } from './play/playHunt';

/** How often namings were right, beside how sure they were. */
export interface Calibration {
  namings: number;
  /** Mean of the probabilities stated. */
  stated: number;
  /** Share that was right. */
  actual: number;
}

/** Namings sorted by how sure they were, in ten groups of equal size. O(n log n). */
export function decilesOf(namings: readonly Naming[]): Calibration[] {
  const sorted = [...namings].sort((a, b) => a.confidence - b.confidence);
  return Array.from({ length: 10 }, (_, decile) =>
    calibrationOf(
      sorted.slice(
        Math.floor((decile * sorted.length) / 10),
        Math.floor(((decile + 1) * sorted.length) / 10),
      ),
    ),
  );
}

/** All namings together; both rates are 1 where nothing was named. */
export function calibrationOf(namings: readonly Naming[]): Calibration {
  const { length } = namings;
  if (length === 0) return { namings: 0, stated: 1, actual: 1 };
  const stated = namings.reduce((sum, { confidence }) => sum + confidence, 0) / length;
  const actual = namings.filter(({ right }) => right).length / length;
  return { namings: length, stated, actual };
}
