import { chakra } from '@chakra-ui/react';
import { stepOf, type Step } from '@lampwright/trace';
import { useMemo, useState } from 'react';
import { SuspicionBar } from '../../../drawing';
import { useAccount } from '../../../lib/session-context';
import { useTraceContext, useTraceLog } from '../store/trace-session';
import { useTraceWords } from '../words/use-trace-words';
import { useOverlay } from './overlay';
import { FormSwitch, PlanView, type PlanForm } from './plan-view';
import { usePhone } from './use-phone';
import { useMarks } from './use-marks';
import { useSlices } from './use-slices';

const Pane = chakra('section', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    gap: '2.5',
    flex: '1',
    minHeight: '0',
    padding: { base: '2', md: '4' },
    paddingBottom: { md: '2.5' },
  },
});
const Picture = chakra('div', {
  base: { flex: '1', minHeight: { base: '130px', md: '0' } },
  variants: { form: { drawing: { height: { base: '130px', md: 'auto' } }, list: {} } },
});
const Foot = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: { base: 'row', lg: 'column' },
    alignItems: { base: 'center', lg: 'stretch' },
    justifyContent: 'flex-end',
    gap: { base: 'touch', lg: '1.5' },
  },
});
const Legend = chakra('p', {
  base: {
    display: 'flex',
    flex: { base: '1', md: 'none' },
    paddingX: { base: '2', md: '0' },
    flexWrap: 'wrap',
    columnGap: '5',
    fontSize: 'sm',
    color: 'fg.muted',
  },
});

/** The steps in which something is in question. */
const HUNT: readonly Step[] = ['narrow', 'inspect', 'repair'];

/** The trailer with what is known drawn on it, and the suspicion as a bar under it. */
export function DrawingPane() {
  const t = useTraceWords();
  const { lengths } = useAccount().preferences;
  const overlay = useOverlay();
  const harness = useTraceContext((context) => context.record.plan.harness);
  const bodyType = useTraceContext((context) => context.record.trailer.bodyType);
  const trailer = useMemo(() => ({ bodyType }), [bodyType]);
  const current = useTraceContext((context) => context.circuit);
  const marks = useMarks(overlay);
  const { slices, inQuestion, cleared } = useSlices();
  const hunting = useTraceLog((log) => HUNT.includes(stepOf(log)));
  const hunted = hunting && slices.length > 0;
  const [form, setForm] = useState<PlanForm>('drawing');
  const phone = usePhone();
  const circuit = overlay.circuit ?? current;
  const picking = useMemo(
    () => ({
      ...(overlay.onPick ? { onPick: overlay.onPick } : {}),
      ...(overlay.pickable ? { pickable: overlay.pickable } : {}),
    }),
    [overlay.onPick, overlay.pickable],
  );
  return (
    <Pane aria-label={t('page.drawing')}>
      <Picture form={form}>
        <PlanView
          form={form}
          onForm={setForm}
          harness={harness}
          circuit={circuit}
          marks={marks}
          lengths={lengths}
          trailer={trailer}
          compact={phone}
          {...picking}
        />
      </Picture>
      {(hunted || phone) && (
        <Foot>
          {hunted && !phone && <SuspicionBar slices={slices} />}
          {hunted && (
            <Legend>
              <span>{t('narrow.inQuestion', { count: inQuestion })}</span>
              <span>{t('narrow.cleared', { count: cleared })}</span>
            </Legend>
          )}
          {phone && <FormSwitch form={form} onForm={setForm} />}
        </Foot>
      )}
    </Pane>
  );
}
