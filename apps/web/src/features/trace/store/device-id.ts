import { uuidv7 } from 'uuidv7';

const KEY = 'lampwright.device';

/** This browser's own name in the order of events; made once and kept. */
export function deviceId(): string {
  const kept = localStorage.getItem(KEY);
  if (kept) return kept;
  const made = uuidv7();
  localStorage.setItem(KEY, made);
  return made;
}
