import type { Part } from '@lampwright/harness';
import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import type { DrawingMarks } from './marks';
import { partMarks } from './place-marks';

/** A part's name and its state in words: "P3 rear plug: unplugged, in question". */
export function usePartWords(marks: DrawingMarks): {
  states: (part: Part) => string[];
  describe: (part: Part) => string;
} {
  const { t } = useTranslation('drawing');
  const states = useCallback(
    (part: Part) => {
      const of = partMarks(part, marks.places);
      const words: string[] = [];
      if (marks.cut.includes(part.id)) words.push(t('state.cut'));
      if (marks.open.includes(part.id)) words.push(t('state.open'));
      if (of.feed !== of.load) {
        words.push(t('feedHalf', { state: t(`mark.${of.feed}`) }));
        words.push(t('loadHalf', { state: t(`mark.${of.load}`) }));
      } else if (of.whole !== 'idle') words.push(t(`mark.${of.whole}`));
      const result = marks.lamps?.get(part.id);
      if (result) words.push(t(`result.${result}`));
      return words;
    },
    [marks, t],
  );
  const describe = useCallback(
    (part: Part) => {
      const words = states(part);
      return words.length
        ? t('described', { label: part.label, states: words.join(', ') })
        : part.label;
    },
    [states, t],
  );
  return { states, describe };
}
