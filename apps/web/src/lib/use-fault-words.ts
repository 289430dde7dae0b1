import type { HarnessFault } from '@lampwright/harness';
import type { TFunction } from 'i18next';
import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';

type Words = TFunction<readonly ['errors', 'faults']>;

const TYPES = ['array', 'object', 'string', 'number', 'boolean', 'null'] as const;

/** A number as it is, the name of a type in words, any other text in quotes. */
function shown(t: Words, value: string | number | undefined): string {
  if (value === undefined) return t('errors:fault.endOfText');
  if (typeof value === 'number') return String(value);
  const type = TYPES.find((name) => name === value);
  return type ? t(`errors:fault.type.${type}`) : t('errors:fault.quoted', { value });
}

function place(t: Words, { path, id }: HarnessFault): string {
  if (path === '') return t('errors:fault.theFile');
  return id === undefined ? path : t('errors:fault.pathAndId', { path, id });
}

/** One sentence about a fault of a plan. */
export function faultSentence(t: Words, fault: HarnessFault): string {
  const { code, circuit, line, column, found, wanted, others = [] } = fault;
  return t(`faults:${code}`, {
    place: place(t, fault),
    onCircuit:
      circuit === undefined
        ? t('errors:fault.onNoCircuit')
        : t('errors:fault.onCircuit', { circuit }),
    found: shown(t, found),
    wanted: shown(t, wanted),
    line: String(line),
    column: String(column),
    others: others.join(', '),
  });
}

export function useFaultWords(): (fault: HarnessFault) => string {
  const { t } = useTranslation(['errors', 'faults'] as const);
  return useCallback((fault: HarnessFault) => faultSentence(t, fault), [t]);
}
