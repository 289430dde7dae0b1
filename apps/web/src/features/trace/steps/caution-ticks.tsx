import { cautionsLeft, type CautionId } from '@lampwright/trace';
import { ChoiceCard } from '../controls/choice-card';
import { Stack } from '../controls/panel';
import { useRecord, useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

/** Cautions, each to be ticked by hand; a tick is recorded at once and stays. */
export function CautionTicks({ cautions }: { cautions: readonly CautionId[] }) {
  const t = useTraceWords();
  const names = useNames();
  const record = useRecord();
  const context = useTraceContext((whole) => whole);
  const left = cautionsLeft(context, [...cautions]);
  const sources = names.list(
    context.record.trailer.secondSources.map((source) => t(`source.${source}`)),
  );
  const tick = (caution: CautionId) => {
    if (left.includes(caution)) void record({ type: 'caution.ticked', caution });
  };
  return (
    <Stack>
      {cautions.map((caution) => (
        <ChoiceCard
          key={caution}
          label={t(`caution.${caution}.text`, { sources })}
          about={t(`caution.${caution}.source`)}
          chosen={!left.includes(caution)}
          onTap={() => tick(caution)}
        />
      ))}
    </Stack>
  );
}
