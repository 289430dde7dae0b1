/** Format 1 was written before a trace could be shared by tablets: its events had no `device` and no `seq`. */
export function upcastEvents(format: number, events: readonly unknown[]): unknown[] {
  if (format !== 1) return [...events];
  return events.map((event, index) =>
    typeof event === 'object' && event !== null
      ? { ...event, device: 'unknown', seq: index + 1 }
      : event,
  );
}
