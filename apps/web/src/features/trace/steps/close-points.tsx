import type { PartId } from '@lampwright/harness';
import { ChoiceCard } from '../controls/choice-card';
import { Stack } from '../controls/panel';
import { useRecord } from '../store/trace-session';
import { useNames } from '../words/use-names';

/** Open points, each ticked off as it is closed and latched. */
export function ClosePoints({ points }: { points: readonly PartId[] }) {
  const names = useNames();
  const record = useRecord();
  return (
    <Stack>
      {points.map((point) => (
        <ChoiceCard
          key={point}
          label={names.part(point)}
          about={names.where(point)}
          chosen={false}
          onTap={() => void record({ type: 'point.reconnected', point })}
        />
      ))}
    </Stack>
  );
}
