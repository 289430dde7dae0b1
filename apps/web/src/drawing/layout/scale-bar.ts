import type { LengthUnit } from '../marks';

/** One foot; exact by the international agreement of 1959. */
const METRES_IN_A_FOOT = 0.3048;

export interface ScaleBar {
  /** Length of the whole bar in its unit. */
  length: number;
  /** Length of the whole bar in pixels. */
  pixels: number;
  /** Equal parts it is drawn in. */
  parts: number;
}

/** The longest bar of a round length (1, 2 or 5 and tens of them) that is not longer than `longest` pixels. */
export function scaleBar(pixelsAMetre: number, unit: LengthUnit, longest: number): ScaleBar {
  const pixelsAUnit = pixelsAMetre * (unit === 'feet' ? METRES_IN_A_FOOT : 1);
  const ten = 10 ** Math.floor(Math.log10(longest / pixelsAUnit));
  const times = [5, 2, 1].find((digit) => digit * ten * pixelsAUnit <= longest) ?? 1;
  const length = Number((times * ten).toPrecision(1));
  return { length, pixels: length * pixelsAUnit, parts: times === 1 ? 2 : times };
}

/** A length in words' raw material: whole feet and inches, or metres to two places. */
export function lengthParts(
  metres: number,
  unit: LengthUnit,
): { feet: number; inches: number } | { metres: number } {
  if (unit === 'metres') return { metres: Math.round(metres * 100) / 100 };
  const inches = Math.round((metres / METRES_IN_A_FOOT) * 12);
  return { feet: Math.floor(inches / 12), inches: inches % 12 };
}
