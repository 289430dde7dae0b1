import type { PartUsed, TraceContext, TraceLog } from '@lampwright/trace';
import { useTraceContext, useTraceLog } from '../../store/trace-session';
import { minutesBetween } from '../../words/minutes-between';
import { useTraceWords } from '../../words/use-trace-words';

/** What the record itself says for the signature. */
export interface Signable {
  cause: string;
  correction: string;
  minutes: number;
  parts: PartUsed[];
}

export function useSignable(): Signable {
  const t = useTraceWords();
  const repairs = useTraceContext((context) => context.repairs);
  const minutes = useTraceLog(minutesOfRecord);
  const joined = (words: string[]) => [...new Set(words)].join('; ');
  if (repairs.length === 0) {
    return { cause: t('sign.nothing'), correction: t('sign.nothingDone'), minutes, parts: [] };
  }
  return {
    cause: joined(repairs.map(({ cause }) => cause)),
    correction: joined(repairs.map(({ correction }) => correction)),
    minutes,
    parts: partsOf(repairs),
  };
}

function minutesOfRecord({ record }: TraceLog): number {
  return minutesBetween(record.openedAt, record.events.at(-1)?.at ?? record.openedAt);
}

/** The parts of all repairs, each name once. */
function partsOf(repairs: TraceContext['repairs']): PartUsed[] {
  const quantityByName = new Map<string, number>();
  for (const { name, quantity } of repairs.flatMap(({ parts }) => parts)) {
    quantityByName.set(name, (quantityByName.get(name) ?? 0) + quantity);
  }
  return [...quantityByName].map(([name, quantity]) => ({ name, quantity }));
}
