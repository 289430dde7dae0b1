import type { Harness } from '@lampwright/harness';
import { TRACE_FORMAT, type TraceRecord, type TraceTrailer } from '../record';
import { defaultSettings } from '../settings';
import { lineHarness } from './lineHarness';

/** A record without events, on an invented trailer. */
export function newRecord(
  trailer: Partial<TraceTrailer> = {},
  harness: Harness = lineHarness,
): TraceRecord {
  return {
    format: TRACE_FORMAT,
    id: '00000000-0000-7000-8000-0000000000aa',
    trailer: {
      id: 'trailer-1',
      unit: 'T-4810',
      bodyType: 'dryVan',
      secondSources: [],
      abs: true,
      ...trailer,
    },
    plan: { id: 'plan-1', revision: 1, harness },
    settings: defaultSettings,
    author: 'person-1',
    openedAt: '2026-11-02T08:00:00.000Z',
    events: [],
  };
}
