import type { Part } from '@lampwright/harness';
import { Maximize, Minus, Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { IconButton } from '../ui';
import { colours } from './drawing-colours';
import { Legend } from './legend';
import type { DrawingMarks } from './marks';
import type { Zoom } from './use-zoom';

interface Props {
  parts: readonly Part[];
  marks: DrawingMarks;
  zoom: Pick<Zoom, 'closer' | 'further' | 'fit'>;
  wide: boolean;
  /** More buttons, after the zoom. */
  children?: ReactNode;
}

/** The key and the zoom buttons under the sheet. */
export function DrawingFooter({ parts, marks, zoom, wide, children }: Props) {
  const { t } = useTranslation('drawing');
  return (
    <div className="lw-footer" style={{ borderColor: colours.line, color: colours.muted }}>
      <Legend parts={parts} marks={marks} inline={wide} />
      <div className="lw-zoom">
        <IconButton icon={Minus} label={t('zoomOut')} onClick={zoom.further} />
        <IconButton icon={Plus} label={t('zoomIn')} onClick={zoom.closer} />
        <IconButton icon={Maximize} label={t('zoomFit')} onClick={zoom.fit} />
        {children}
      </div>
    </div>
  );
}
