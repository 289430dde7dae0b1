import type { PartId } from '@lampwright/harness';
import type { LampResult, LampsOfCircuit } from '@lampwright/trace';
import { useCallback, useMemo, useState } from 'react';
import { Callout } from '../../../../ui';
import { AnswerButton } from '../../controls/answer-button';
import { GoBackButton, GoOnButton } from '../../controls/field-button';
import { Eyebrow, Panel, PanelAnswers, PanelBody, Row, Stack } from '../../controls/panel';
import { StepHeading } from '../../controls/step-heading';
import { useShowOnDrawing } from '../../layout/overlay';
import { useRecord } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import { LampCard } from './lamp-card';

interface CheckLampsProps {
  check: LampsOfCircuit;
  at: number;
  of: number;
  /** Starts with the list instead of the one question. */
  oneByOne: boolean;
  done: () => void;
}

/** The lamps of a circuit that is on: all lit in one touch, or one after another in the list and on the drawing. */
export function CheckLamps({ check, at, of, oneByOne, done }: CheckLampsProps) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const { circuit, lamps } = check;
  const [listing, setListing] = useState(oneByOne);
  const [touched, setTouched] = useState<PartId | null>(null);
  const touch = useCallback((part: PartId) => {
    setListing(true);
    setTouched(part);
  }, []);
  useShowOnDrawing(
    useMemo(
      () => ({
        circuit,
        lamps: new Map(
          lamps.flatMap(({ lamp, result }) => (result ? [[lamp.id, result] as const] : [])),
        ),
        pickable: new Set(lamps.map(({ lamp }) => lamp.id)),
        onPick: touch,
      }),
      [circuit, lamps, touch],
    ),
  );
  const left = lamps.filter(({ result }) => result === null).length;
  const say = (lamp: PartId, result: LampResult) => {
    setTouched(null);
    void record({ type: 'lamp.checked', circuit, lamp, result });
  };
  const allLit = async () => {
    if (await record({ type: 'circuit.allLit', circuit })) done();
  };
  const ordered = touched
    ? [...lamps].sort((a, b) => Number(b.lamp.id === touched) - Number(a.lamp.id === touched))
    : lamps;
  return (
    <Panel>
      <PanelBody>
        <Eyebrow>{t('lampCheck.eyebrow', { at, of })}</Eyebrow>
        <StepHeading screen={`lamps-${circuit}`}>
          {t('lampCheck.title', { circuit: names.circuitWithPin(circuit) })}
        </StepHeading>
        {listing ? (
          <Stack>
            {ordered.map(({ lamp, result }) => (
              <LampCard
                key={lamp.id}
                lamp={lamp}
                result={result}
                onSay={(said) => say(lamp.id, said)}
              />
            ))}
          </Stack>
        ) : (
          <Callout>{t('lampCheck.off')}</Callout>
        )}
      </PanelBody>
      <PanelAnswers>
        {left === 0 ? (
          <GoOnButton wide onTap={done}>
            {t('lampCheck.nextCircuit')}
          </GoOnButton>
        ) : (
          <AnswerButton
            tone="holds"
            label={left < lamps.length ? t('lampCheck.restLit') : t('lampCheck.allLit')}
            about={t('lampCheck.allLitAbout', { count: left })}
            onTap={() => void allLit()}
          />
        )}
        {!listing && (
          <Row>
            <GoBackButton onTap={() => setListing(true)}>{t('lampCheck.one')}</GoBackButton>
          </Row>
        )}
      </PanelAnswers>
    </Panel>
  );
}
