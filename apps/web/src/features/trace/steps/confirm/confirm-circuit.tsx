import type { CircuitId } from '@lampwright/harness';
import type { Seen } from '@lampwright/trace';
import { useMemo, useState } from 'react';
import { Callout } from '../../../../ui';
import { useAnnounce } from '../../controls/announcer';
import { Eyebrow, Panel, PanelBody } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { outcomeWords } from '../../words/outcome-words';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { AmpsField, readAmps } from '../amps-field';
import { PowerOn } from '../power-on';
import { ReadingAnswers } from '../reading-answers';

const NOTHING_OPEN: readonly string[] = [];

export function ConfirmCircuit({ circuit }: { circuit: CircuitId }) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const announce = useAnnounce();
  const [amps, setAmps] = useState('');
  const feed = useTraceContext((context) => context.feed);
  const suspects = useTraceContext((context) => context.suspects);
  useShowOnDrawing(useMemo(() => ({ circuit }), [circuit]));
  if (!feed) return null;
  const answer = async (outcome: Seen | 'dark') => {
    const done = await record({ type: 'circuit.confirmed', circuit, outcome, ...readAmps(amps) });
    if (done) announce(`${names.circuit(circuit)}: ${outcomeWords(outcome, feed, t)}`);
  };
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>
          {t('confirm.eyebrow', { at: suspects.indexOf(circuit) + 1, of: suspects.length })}
        </Eyebrow>
        <StepHeading screen={circuit}>
          {t('confirm.title', { circuit: names.circuitWithPin(circuit) })}
        </StepHeading>
        <Callout tone="caution">
          {t('confirm.before')} {t('confirm.switchOff')}
        </Callout>
        <AmpsField circuit={circuit} open={NOTHING_OPEN} value={amps} onChange={setAmps} />
      </PanelBody>
      <ReadingAnswers
        ask={<PowerOn feed={feed} circuit={circuit} />}
        feed={feed}
        onAnswer={(outcome) => void answer(outcome)}
        onDark={() => void answer('dark')}
      />
    </Panel>
  );
}
