import { placeKey, type PlaceRef } from '@lampwright/harness';
import { samePlace } from '@lampwright/trace';
import { FieldButton } from '../../controls/field-button';
import { Stack } from '../../controls/panel';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';
import type { PlaceToInspect } from './places-to-inspect';

interface PlaceListProps {
  places: readonly PlaceToInspect[];
  current: PlaceRef | null;
  onPick: (place: PlaceRef) => void;
}

/** Where the short can be, the likeliest first, with how likely; those looked at say so. */
export function PlaceList({ places, current, onPick }: PlaceListProps) {
  const t = useTraceWords();
  const names = useNames();
  return (
    <Stack>
      {places.map(({ ref, probability, clear }) => (
        <FieldButton
          key={placeKey(ref)}
          wide
          justifyContent="space-between"
          textAlign="start"
          disabled={clear}
          pressed={current !== null && samePlace(ref, current)}
          onTap={() => onPick(ref)}
        >
          <span>{names.place(ref)}</span>
          <span style={{ whiteSpace: 'nowrap' }}>
            {clear
              ? t('inspect.done')
              : t('inspect.likely', { percent: Math.max(1, Math.round(probability * 100)) })}
          </span>
        </FieldButton>
      ))}
    </Stack>
  );
}
