import type { CircuitId, PartId } from '@lampwright/harness';
import { ampsVerdict, type AmpsVerdict } from '@lampwright/isolation';
import { useMemo } from 'react';
import { Callout } from '../../../ui';
import { useTraceContext } from '../store/trace-session';
import { useNames } from '../words/use-names';
import { useTraceWords } from '../words/use-trace-words';

interface AmpsMeaningProps {
  circuit: CircuitId;
  open: readonly PartId[];
  amps: number;
}

/** Fits named, the best first; the rest would only lengthen the walk. */
const NAMED = 3;

/** What amps of a circuit that holds say, as far as lamps and meter let them say anything. */
export function AmpsMeaning({ circuit, open, amps }: AmpsMeaningProps) {
  const t = useTraceWords();
  const harness = useTraceContext((context) => context.record.plan.harness);
  const feed = useTraceContext((context) => context.feed?.kind);
  const verdict = useMemo(
    () => ampsVerdict(harness, circuit, open, amps),
    [harness, circuit, open, amps],
  );
  // A lamp in series sets the amps itself, and an ohmmeter feeds next to none.
  if (feed === 'seriesLamp' || feed === 'ohmmeter') return null;
  const { least, most } = verdict.expected;
  const band = { least: least.toFixed(1), most: most.toFixed(1) };
  return (
    <Callout
      role="status"
      tone={verdict.kind === 'above' ? 'next' : 'note'}
      title={t(`amps.${verdict.kind}`, band)}
    >
      <Consequence verdict={verdict} />
    </Callout>
  );
}

function Consequence({ verdict }: { verdict: AmpsVerdict }) {
  const t = useTraceWords();
  const names = useNames();
  switch (verdict.kind) {
    case 'above':
      return t('amps.aboveMeans', { excess: verdict.excess.least.toFixed(1) });
    case 'below': {
      const fits = verdict.fits
        .slice(0, NAMED)
        .map(({ at, loads }) =>
          loads > 1 ? t('amps.behind', { part: names.part(at), count: loads }) : names.part(at),
        );
      return fits.length > 0
        ? t('amps.belowMeans', { parts: fits.join('; ') })
        : t('amps.belowSeveral');
    }
    case 'asExpected':
      return verdict.mayHide.length > 0
        ? t('amps.mayHide', { count: verdict.mayHide.length })
        : t('amps.nothingHides');
    case 'tooCoarse':
      return t('amps.tooCoarseMeans');
  }
}
