/** Whole minutes from one ISO 8601 time to another, never below 0: clocks of two devices may disagree. */
export function minutesBetween(from: string, to: string): number {
  return Math.max(0, Math.round((Date.parse(to) - Date.parse(from)) / 60_000));
}
