import { chakra } from '@chakra-ui/react';
import type { Step, TraceRecord } from '@lampwright/trace';
import { ChevronFirst, ChevronLast, ChevronLeft, ChevronRight } from 'lucide-react';
import { Callout } from '../../../ui';
import { FieldButton } from '../controls/field-button';
import { Eyebrow, Panel, PanelAnswers, PanelBody, Row, Small, Text } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { Facts } from '../steps/facts';
import { useTraceWords } from '../words/use-trace-words';
import { useEventWords } from './use-event-words';

const Entries = chakra('ol', {
  base: { display: 'flex', flexDirection: 'column', gap: 'touch', listStyle: 'none' },
});

interface ReplayPanelProps {
  record: TraceRecord;
  /** How many entries are shown. */
  at: number;
  step: Step;
  onMove: (at: number) => void;
  onClose?: () => void;
}

/** One entry of the record, and the way to the others. */
export function ReplayPanel({ record, at, step, onMove, onClose }: ReplayPanelProps) {
  const t = useTraceWords();
  const words = useEventWords();
  const { events } = record;
  const event = events[at - 1];
  const of = events.length;
  return (
    <Panel>
      <PanelBody data-panel-scroll>
        <Eyebrow>{t('replay.event', { at, of })}</Eyebrow>
        <StepHeading screen="replay">
          {event ? capital(t(`event.${event.type}`)) : t('replay.begun')}
        </StepHeading>
        <div role="status">
          {event && <Text>{words(event)}</Text>}
          <Small>{new Date(event?.at ?? record.openedAt).toLocaleString()}</Small>
        </div>
        <Facts
          facts={[{ key: 'step', name: t('replay.stepAfter'), value: t(`common:step.${step}`) }]}
        />
        <Callout>{t('replay.readOnly')}</Callout>
        <Entries aria-label={t('replay.list')}>
          {events.map((each, index) => (
            <li key={each.id}>
              <FieldButton
                wide
                justifyContent="flex-start"
                textAlign="start"
                pressed={index === at - 1}
                onTap={() => onMove(index + 1)}
              >
                {index + 1}. {words(each) || capital(t(`event.${each.type}`))}
              </FieldButton>
            </li>
          ))}
        </Entries>
      </PanelBody>
      <PanelAnswers>
        <Row>
          <FieldButton
            size="answer"
            icon={ChevronLeft}
            disabled={at === 0}
            onTap={() => onMove(at - 1)}
          >
            {t('replay.back')}
          </FieldButton>
          <FieldButton
            size="answer"
            icon={ChevronRight}
            disabled={at === of}
            onTap={() => onMove(at + 1)}
          >
            {t('replay.forward')}
          </FieldButton>
        </Row>
        <Row>
          <FieldButton icon={ChevronFirst} disabled={at === 0} onTap={() => onMove(0)}>
            {t('replay.first')}
          </FieldButton>
          <FieldButton icon={ChevronLast} disabled={at === of} onTap={() => onMove(of)}>
            {t('replay.last')}
          </FieldButton>
        </Row>
        {onClose && (
          <FieldButton wide onTap={onClose}>
            {t('replay.close')}
          </FieldButton>
        )}
      </PanelAnswers>
    </Panel>
  );
}

function capital(words: string): string {
  return words.charAt(0).toLocaleUpperCase() + words.slice(1);
}
