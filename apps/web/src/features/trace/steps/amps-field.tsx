import type { CircuitId, PartId } from '@lampwright/harness';
import { expectedLoad } from '@lampwright/isolation';
import { useMemo, useState } from 'react';
import { TextInput } from '../../../ui';
import { FieldButton } from '../controls/field-button';
import { useTraceContext } from '../store/trace-session';
import { useTraceWords } from '../words/use-trace-words';
import { AmpsMeaning } from './amps-meaning';

interface AmpsFieldProps {
  circuit: CircuitId;
  /** What is open while power is on. */
  open: readonly PartId[];
  value: string;
  onChange: (value: string) => void;
}

/** Amps for those who have a meter on it, with what a healthy circuit would draw beside; folded away until asked for. */
export function AmpsField({ circuit, open, value, onChange }: AmpsFieldProps) {
  const t = useTraceWords();
  const harness = useTraceContext((context) => context.record.plan.harness);
  const expected = useMemo(
    () => expectedLoad(harness, circuit, open).amps,
    [harness, circuit, open],
  );
  const { amps } = readAmps(value);
  const [asked, setAsked] = useState(false);
  if (!asked && value === '') {
    return (
      <FieldButton look="quiet" alignSelf="flex-start" onTap={() => setAsked(true)}>
        {t('confirm.addAmps')}
      </FieldButton>
    );
  }
  return (
    <>
      <TextInput
        size="field"
        inputMode="decimal"
        label={t('confirm.amps')}
        hint={t('confirm.ampsExpected', { amps: expected.toFixed(1) })}
        value={value}
        onChange={(event) => onChange(event.target.value)}
      />
      {amps !== undefined && <AmpsMeaning circuit={circuit} open={open} amps={amps} />}
    </>
  );
}

/** What was typed as amps, by comma or point; nothing where it is no number. */
export function readAmps(text: string): { amps?: number } {
  const amps = Number.parseFloat(text.trim().replace(',', '.'));
  return Number.isFinite(amps) && amps >= 0 ? { amps } : {};
}
