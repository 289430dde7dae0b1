import { energisedSections, type PartId, type SectionTree } from '@lampwright/harness';
import { situation } from '@lampwright/trace';
import { useTraceContext } from '../../store/trace-session';
import { useNames } from '../../words/use-names';
import { useTraceWords } from '../../words/use-trace-words';

/** What each answer would mean. Nothing where a short may come and go, or where there may be several: then it is no more than evidence. */
export function useAnswerMeanings(open: readonly PartId[]): { overload?: string; holds?: string } {
  const t = useTraceWords();
  const names = useNames();
  const now = useTraceContext(situation);
  const certain = useTraceContext((context) => !context.comesAndGoes && context.maxFaults === 1);
  const parts = useTraceContext((context) => context.record.plan.harness.parts);
  if (!now || !certain) return {};
  const point = decidingPoint(now.tree, now.sectionsInQuestion, open);
  if (point === null) return { overload: t('answer.stillFed'), holds: t('answer.unplugged') };
  const label = { point: names.part(point) };
  return parts.find(({ id }) => id === point)?.kind === 'plug'
    ? { overload: t('answer.ahead', label), holds: t('answer.behind', label) }
    : { overload: t('answer.notLamp', label), holds: t('answer.lampItself', label) };
}

/** The one open point that alone parts what is in question as all the open ones do; `null` where it takes several. */
function decidingPoint(
  tree: SectionTree,
  inQuestion: readonly number[],
  open: readonly PartId[],
): PartId | null {
  const all = energisedSections(tree, open);
  const deciding = open.find((point) => {
    const alone = energisedSections(tree, [point]);
    return inQuestion.every((section) => alone[section] === all[section]);
  });
  return deciding ?? null;
}
