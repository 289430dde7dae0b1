import { chakra } from '@chakra-ui/react';
import { List, Map } from 'lucide-react';
import { HarnessDrawing, HarnessList, type HarnessDrawingProps } from '../../../drawing';
import { FieldButton } from '../controls/field-button';
import { useTraceWords } from '../words/use-trace-words';

export type PlanForm = 'drawing' | 'list';

const Unseen = chakra('div', { base: { srOnly: true } });
const Rows = chakra('div', {
  base: {
    flex: '1',
    minHeight: '0',
    maxHeight: { base: '40dvh', md: 'none' },
    overflowY: 'auto',
    bg: 'bg.panel',
    borderRadius: 'md',
    padding: '1.5',
    borderWidth: '1px',
    borderColor: 'line',
  },
});
const Tools = chakra('div', {
  base: { display: 'flex', justifyContent: 'flex-end', paddingX: '2', paddingY: '1' },
});
const Sheet = chakra('div', { base: { height: 'full', position: 'relative' } });
const Whole = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', height: 'full', minHeight: '0' },
});

interface PlanViewProps extends Omit<HarnessDrawingProps, 'tools'> {
  form: PlanForm;
  onForm: (form: PlanForm) => void;
}

/**
 * The plan as a drawing or as a list that says the same. Beside the drawing the list is there for those who do not see
 * it, without buttons of its own: those of the drawing have the same names.
 */
export function PlanView({ form, onForm, ...plan }: PlanViewProps) {
  const { harness, circuit, marks, onPick, pickable, compact } = plan;
  const tool = <FormSwitch form={form} onForm={onForm} />;
  if (form === 'drawing') {
    return (
      <Sheet>
        <HarnessDrawing {...plan} tools={tool} />
        <Unseen>
          <HarnessList harness={harness} circuit={circuit} marks={marks} />
        </Unseen>
      </Sheet>
    );
  }
  return (
    <Whole>
      <Rows>
        <HarnessList
          harness={harness}
          circuit={circuit}
          marks={marks}
          {...(onPick ? { onPick } : {})}
          {...(pickable ? { pickable } : {})}
        />
      </Rows>
      {!compact && <Tools>{tool}</Tools>}
    </Whole>
  );
}

/** To the other form of the plan. */
export function FormSwitch({ form, onForm }: Pick<PlanViewProps, 'form' | 'onForm'>) {
  const t = useTraceWords();
  return form === 'drawing' ? (
    <FieldButton icon={List} onTap={() => onForm('list')}>
      {t('page.showList')}
    </FieldButton>
  ) : (
    <FieldButton icon={Map} onTap={() => onForm('drawing')}>
      {t('page.showDrawing')}
    </FieldButton>
  );
}
