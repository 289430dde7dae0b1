import { chakra } from '@chakra-ui/react';
import type { CircuitId, Harness, PartId } from '@lampwright/harness';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { HarnessDrawing, HarnessList, type DrawingMarks, type DrawingTrailer } from '../drawing';
import { useAccount } from '../lib/session-context';
import { Select } from './select';
import { VisuallyHidden } from './visually-hidden';

/** No question is asked of the plan here. */
const UNMARKED: DrawingMarks = { cut: [], open: [], places: new Map() };

const Root = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: '4', minW: '0' },
});
const Picker = chakra('div', { base: { maxW: '26rem' } });
const Sheet = chakra('div', {
  base: {
    display: 'flex',
    flexDirection: 'column',
    h: { base: '25rem', md: '29rem' },
    minW: '0',
    '& > *': { flex: '1', minH: '0' },
  },
});
const Picked = chakra('p', {
  base: { minH: '1.5em', color: 'fg.muted', '& strong': { color: 'fg' } },
});

/** A plan to look at: the drawing, a circuit at a time, and the part that is tapped in words. */
export function PlanPicture({ harness, trailer }: { harness: Harness; trailer?: DrawingTrailer }) {
  const { t } = useTranslation();
  const { lengths } = useAccount().preferences;
  const [circuit, setCircuit] = useState<CircuitId | null>(null);
  const [picked, setPicked] = useState<PartId | null>(null);
  const part = harness.parts.find(({ id }) => id === picked);
  return (
    <Root>
      <Picker>
        <Select
          size="office"
          label={t('picture.circuit')}
          value={circuit ?? ''}
          onChange={(event) => setCircuit(event.target.value || null)}
          options={[
            { value: '', label: t('picture.allCircuits') },
            ...harness.circuits.map(({ id, name }) => ({ value: id, label: name })),
          ]}
        />
      </Picker>
      <Sheet>
        <HarnessDrawing
          harness={harness}
          circuit={circuit}
          marks={UNMARKED}
          lengths={lengths}
          onPick={setPicked}
          {...(trailer ? { trailer } : {})}
        />
        <VisuallyHidden as="div">
          <HarnessList harness={harness} circuit={circuit} marks={UNMARKED} />
        </VisuallyHidden>
      </Sheet>
      <Picked role="status">
        {part ? (
          <>
            <strong>{part.label}</strong> {part.where}
          </>
        ) : (
          t('picture.tap')
        )}
      </Picked>
    </Root>
  );
}
