import type { TFunction } from 'i18next';
import type { DrawingMarks } from './marks';
import type { Part } from '@lampwright/harness';
import { partMarks } from './place-marks';

/** The picture in two or three sentences, for those who do not see it. */
export function pictureWords(
  t: TFunction<'drawing'>,
  name: string,
  parts: readonly Part[],
  marks: DrawingMarks,
): string {
  const states = [...marks.places.values()];
  const inQuestion = states.filter((state) => state === 'inQuestion').length;
  const cleared = states.filter((state) => state === 'cleared').length;
  const labels = (of: (part: Part) => boolean) =>
    parts
      .filter(of)
      .map((part) => part.label)
      .join(', ');
  const cut = labels((part) => marks.cut.includes(part.id));
  const open = labels((part) => marks.open.includes(part.id));
  const found = labels((part) => partMarks(part, marks.places).whole === 'found');
  return [
    inQuestion + cleared > 0
      ? t('picture', { name, inQuestion, cleared })
      : t('pictureIdle', { name, count: parts.length }),
    cut && t('pictureCut', { labels: cut }),
    open && t('pictureOpen', { labels: open }),
    found && t('pictureFound', { labels: found }),
  ]
    .filter(Boolean)
    .join(' ');
}
