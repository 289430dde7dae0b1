import type { HarnessFault } from '../faults';
import { findJsonError } from './jsonError';
import { readHarness, type HarnessReading } from './readHarness';

/** Far beyond the largest plan anyone draws: ten thousand parts take about 3 MB. */
export const DEFAULT_MAX_BYTES = 10_000_000;

/**
 * Reads a plan from the text of a file. A byte order mark at the start is no fault. Faults of the text itself are
 * `tooLarge` (`found` and `wanted` in bytes of UTF-8) and `notJson` (`line` and `column`; `found` is the character
 * there, absent at the end of the text); all others are those of `readHarness`. Never throws. O(length).
 */
export function readHarnessText(
  text: string,
  { maxBytes = DEFAULT_MAX_BYTES }: { maxBytes?: number } = {},
): HarnessReading {
  const bytes = bytesOf(text);
  if (bytes > maxBytes) {
    return refuse({ code: 'tooLarge', path: '', found: bytes, wanted: maxBytes });
  }
  const json = text.startsWith('\uFEFF') ? text.slice(1) : text;
  let document: unknown;
  try {
    document = JSON.parse(json);
  } catch {
    const { found, ...place } = findJsonError(json) ?? {};
    return refuse({ code: 'notJson', path: '', ...place, ...(found !== undefined && { found }) });
  }
  return readHarness(document);
}

function refuse(fault: HarnessFault): HarnessReading {
  return { ok: false, faults: [fault], more: false };
}

function bytesOf(text: string): number {
  return new TextEncoder().encode(text).length;
}
