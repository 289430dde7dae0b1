import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { labelRequests } from './label-requests';
import { labelSurroundings } from './label-surroundings';
import type { DrawingLayout } from './layout/layout-harness';
import { placeLabels, type PlacedLabel } from './layout/place-labels';
import type { DrawingMarks, HarnessView } from './marks';
import { sheetTexts, type SheetText } from './sheet-texts';

interface Input {
  layout: DrawingLayout;
  marks: DrawingMarks;
  pickable: HarnessView['pickable'];
  few: boolean;
  flagged: ReadonlySet<string>;
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
  const flagged = [...input.flagged].sort().join('\n');
  return useMemo(() => {
    const textSize = Math.min(13.5, Math.max(11, (layout.sheet.width / 48) * 0.9));
    const texts = sheetTexts(layout.frame, textSize, {
      front: t('front'),
      rear: t('rear'),
      curbSide: t('curbSide'),
      roadSide: t('roadSide'),
      frontFace: t('frontFace'),
      rearFace: t('rearFace'),
    });
    const requests = labelRequests({
      parts: layout.parts,
      positions: layout.positions,
      reach: (layout.symbol * ink) / 2,
      marks,
      pickable: (id) => pickable?.has(id) ?? false,
      flagged: new Set(flagged.split('\n')),
      few,
      wording: (part, what) =>
        what === 'found'
          ? t('foundHere', { label: part.label })
          : what === 'open'
            ? t('openPart', { label: part.label })
            : part.label,
    });
    const around = labelSurroundings(layout, marks, compact ? [] : texts, ink, dimensionY);
    return { texts, placed: placeLabels(requests, { ...around, size }) };
  }, [layout, marks, pickable, few, flagged, size, ink, compact, dimensionY, t]);
}
