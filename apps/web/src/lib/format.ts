import type { Preferences } from '@lampwright/contracts';

const METRES_PER_INCH = 0.0254;

export type LengthUnit = Preferences['lengths'];

/** `48 ft`, `13 ft 6 in`, or `14.6 m`. Inches are rounded to whole ones. */
export function formatLength(metres: number, unit: LengthUnit): string {
  if (unit === 'metres') {
    return `${new Intl.NumberFormat('en', { maximumFractionDigits: 1 }).format(metres)} m`;
  }
  const inches = Math.round(metres / METRES_PER_INCH);
  const feet = Math.floor(inches / 12);
  const rest = inches % 12;
  if (feet === 0) return `${rest} in`;
  return rest === 0 ? `${feet} ft` : `${feet} ft ${rest} in`;
}

/** A length as it stands in a field: feet or metres with two decimals at most. */
export function lengthToField(metres: number, unit: LengthUnit): string {
  const value = unit === 'metres' ? metres : metres / METRES_PER_INCH / 12;
  return String(Math.round(value * 100) / 100);
}

/** Metres to the millimetre from what was typed in feet or metres; `NaN` where it is no number. */
export function lengthFromField(text: string, unit: LengthUnit): number {
  const typed = text.trim().replace(',', '.');
  if (typed === '') return Number.NaN;
  const metres = Number(typed) * (unit === 'metres' ? 1 : METRES_PER_INCH * 12);
  return Math.round(metres * 1000) / 1000;
}

/** `45 s`, `3 min 50 s`, `1 h 5 min`. */
export function formatDuration(seconds: number): string {
  const whole = Math.max(0, Math.round(seconds));
  if (whole < 60) return `${whole} s`;
  const minutes = Math.floor(whole / 60);
  if (minutes < 60) return whole % 60 === 0 ? `${minutes} min` : `${minutes} min ${whole % 60} s`;
  const hours = Math.floor(minutes / 60);
  return minutes % 60 === 0 ? `${hours} h` : `${hours} h ${minutes % 60} min`;
}

/** `Dec 1, 2026`. */
export function formatDate(iso: string): string {
  return new Intl.DateTimeFormat('en', { dateStyle: 'medium' }).format(new Date(iso));
}

/** `Dec 1, 2026, 6:40 AM`. */
export function formatDateTime(iso: string): string {
  return new Intl.DateTimeFormat('en', { dateStyle: 'medium', timeStyle: 'short' }).format(
    new Date(iso),
  );
}
