import type { CircuitId } from '@lampwright/harness';
import type { Feed, Seen } from '@lampwright/trace';
import { useMemo } from 'react';
import { Callout } from '../../../../ui';
import { Eyebrow, Panel, PanelBody } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord, useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { PowerOn } from '../power-on';
import { ReadingAnswers } from '../reading-answers';

interface PowerCircuitProps {
  circuit: CircuitId;
  at: number;
  of: number;
}

/** One circuit on, with everything connected; an overload now opens another hunt. */
export function PowerCircuit({ circuit, at, of }: PowerCircuitProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const feed = useTraceContext((context) => context.feed);
  useShowOnDrawing(useMemo(() => ({ circuit }), [circuit]));
  if (!feed) return null;
  const answer = (outcome: Seen) => void record({ type: 'circuit.powered', circuit, outcome });
  // Lamps do not light through a series lamp or a meter: this check needs a proper supply.
  const lampsLight = feed.kind !== 'seriesLamp' && feed.kind !== 'ohmmeter';
  const supply: Feed = lampsLight ? feed : { kind: 'tester', atHand: feed.atHand };
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>{t('lampCheck.eyebrow', { at, of })}</Eyebrow>
        <StepHeading screen={`power-${circuit}`}>
          {t('lampCheck.powerTitle', { circuit: names.circuitWithPin(circuit) })}
        </StepHeading>
        {!lampsLight && <Callout tone="next">{t('lampCheck.properSupply')}</Callout>}
        <Callout tone="caution">
          {t('caution.noHolding.text')} {t('caution.noBypass.text')}
        </Callout>
      </PanelBody>
      <ReadingAnswers
        ask={<PowerOn feed={supply} circuit={circuit} />}
        feed={supply}
        about={{ overload: t('prove.overloadAbout') }}
        onAnswer={answer}
      />
    </Panel>
  );
}
