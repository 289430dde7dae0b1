import { isInspectedClear } from '../meanings';
import { situation } from '../situation';
import type { TraceContext } from '../state';
import type { Change } from './change';

/** What a person says the contradiction means, taken as said. It stays open where that does not explain it. */
export const explain: Change<'contradiction.explained'> = (context, { meaning }) => {
  switch (meaning) {
    case 'comesAndGoes':
      return settled({ ...context, comesAndGoes: true });
    case 'secondShort':
      return settled({ ...context, maxFaults: context.maxFaults + 1 });
    case 'planIsWrong':
      return settled(startOver(context));
    case 'repairedByHandling':
      return { ...context, contradiction: null, found: null, proven: {} };
  }
};

/** Nothing that was read by the wrong plan counts any more, nor what was looked at because of it. */
function startOver(context: TraceContext): TraceContext {
  return {
    ...context,
    powerUps: context.powerUps.map((powerUp) => ({ ...powerUp, counts: false })),
    inspected: [],
  };
}

function settled(context: TraceContext): TraceContext {
  const open =
    context.contradiction === 'sectionClear'
      ? isInspectedClear(context)
      : situation(context)?.belief.contradicted;
  return open ? context : { ...context, contradiction: null };
}
