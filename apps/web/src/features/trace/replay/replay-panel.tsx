import { chakra } from '@chakra-ui/react';
import type { Step, TraceEvent, TraceRecord } from '@lampwright/trace';
import { ChevronFirst, ChevronLast, ChevronLeft, ChevronRight } from 'lucide-react';
import { FieldButton } from '../controls/field-button';
import { Eyebrow, Panel, PanelAnswers, PanelBody, Row, Small, Text } from '../controls/panel';
import { StepHeading } from '../controls/step-heading';
import { useTraceWords } from '../words/use-trace-words';
import { ReplayEntries } from './replay-entries';
import { useEventWords } from './use-event-words';

const Current = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    gap: '1.5',
    paddingX: '5',
    paddingTop: '4',
    paddingBottom: '3',
    minHeight: { md: '216px' },
    borderBottomWidth: '1px',
    borderColor: 'line',
  },
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
  const nameOf = (each: TraceEvent) => capital(t(`event.${each.type}`));
  return (
    <Panel>
      <Current>
        <Eyebrow>
          {t('replay.event', { at, of })} · {t('replay.readOnly')}
        </Eyebrow>
        <StepHeading screen="replay">{event ? nameOf(event) : t('replay.begun')}</StepHeading>
        <div role="status">
          {event && <Text>{words(event)}</Text>}
          <Small>
            {new Date(event?.at ?? record.openedAt).toLocaleString()} ·{' '}
            {t('replay.stepAfter', { step: t(`common:step.${step}`) })}
          </Small>
        </div>
      </Current>
      <PanelBody>
        <ReplayEntries
          events={events}
          at={at}
          words={(each) => words(each) || nameOf(each)}
          onMove={onMove}
        />
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
          {onClose && <FieldButton onTap={onClose}>{t('replay.close')}</FieldButton>}
        </Row>
      </PanelAnswers>
    </Panel>
  );
}

function capital(words: string): string {
  return words.charAt(0).toLocaleUpperCase() + words.slice(1);
}
