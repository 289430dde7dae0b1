import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { labelRequests } from './label-requests';
import { cutBoxes, labelSurroundings, symbolBoxes, wireBoxes } from './label-surroundings';
import type { DrawingLayout } from './layout/layout-harness';
import type { PlacedFlag } from './layout/place-flags';
import { placeLabels, type PlacedLabel } from './layout/place-labels';
import type { DrawingMarks, HarnessView } from './marks';
import { sheetTexts, type SheetText } from './sheet-texts';

interface Input {
  layout: DrawingLayout;
  marks: DrawingMarks;
  pickable: HarnessView['pickable'];
  few: boolean;
  flags: readonly PlacedFlag[];
  /** Letter height in pixels of the drawing: smaller as it is magnified, so that more labels fit. */
  size: number;
  ink: number;
  compact: boolean;
  dimensionY: number | null;
}

/** The sheet's own texts, and the labels that fit around them. */
export function useLabels(input: Input): { texts: SheetText[]; placed: PlacedLabel[] } {
  const { layout, marks, pickable, few, size, ink, compact, dimensionY } = input;
  const { t } = useTranslation('drawing');
  const flagKey = JSON.stringify(input.flags);
  return useMemo(() => {
    const flags = JSON.parse(flagKey) as PlacedFlag[];
    const textSize = Math.min(13.5, Math.max(11, (layout.sheet.width / 48) * 0.9));
    const texts = sheetTexts(
      layout.frame,
      textSize,
      {
        front: t('front'),
        rear: t('rear'),
        curbSide: t('curbSide'),
        roadSide: t('roadSide'),
        frontFace: t('frontFace'),
        rearFace: t('rearFace'),
      },
      [
        ...symbolBoxes(layout, 1),
        ...wireBoxes(layout, layout.symbol / 2),
        ...cutBoxes(layout, marks, 1),
        ...flags.map((flag) => flag.box),
      ],
    );
    const requests = labelRequests({
      parts: layout.parts,
      positions: layout.positions,
      reach: (layout.symbol * ink) / 2,
      marks,
      pickable: (id) => pickable?.has(id) ?? false,
      flagged: new Set(flags.map((flag) => flag.id)),
      few,
      near: ink < 0.8,
      wording: (part, what) =>
        what === 'found'
          ? t('foundHere', { label: part.label })
          : what === 'open'
            ? t('openPart', { label: part.label })
            : part.label,
    });
    const around = labelSurroundings({
      layout,
      marks,
      texts: compact ? [] : texts,
      // Flags keep their place on the screen; magnified, they lie on top.
      flags: ink === 1 ? flags.map((flag) => flag.box) : [],
      ink,
      dimensionY,
    });
    return { texts, placed: placeLabels(requests, { ...around, size }) };
  }, [layout, marks, pickable, few, flagKey, size, ink, compact, dimensionY, t]);
}
