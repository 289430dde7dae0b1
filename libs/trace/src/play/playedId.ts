/**
 * A UUID, version 7 in form, that the trace, the event's number and its time fix. Played events of different traces
 * thereby differ, as those of real ones do.
 */
export function playedId(trace: string, seq: number, at: number): string {
  const time = hex(at, 12);
  return [
    time.slice(0, 8),
    time.slice(8),
    `7${hex(seq, 3)}`,
    `8${hex(hash(trace, 1), 3)}`,
    `${hex(hash(trace, 2), 8)}${hex(seq, 4)}`,
  ].join('-');
}

function hex(value: number, digits: number): string {
  return value.toString(16).padStart(digits, '0').slice(-digits);
}

/** FNV-1a over the characters' codes. */
function hash(text: string, salt: number): number {
  let value = 0x811c9dc5 ^ salt;
  for (const character of text) {
    value = Math.imul(value ^ (character.codePointAt(0) ?? 0), 0x01000193);
  }
  return value >>> 0;
}
