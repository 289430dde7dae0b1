import type { Part } from '@lampwright/harness';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { colours } from './drawing-colours';
import './drawing.css';
import { shownHarness } from './layout/shown-circuit';
import type { HarnessListProps } from './marks';
import { PartSymbol } from './part-symbol';
import { partTree, type PartNode } from './part-tree';
import { partMarks, runMark } from './place-marks';
import { usePartWords } from './use-part-words';

/** The drawing in words: every part under the one that feeds it, with its state, and a button where it can be picked. */
export function HarnessList({ harness, circuit, marks, onPick, pickable }: HarnessListProps) {
  const { t } = useTranslation('drawing');
  const { states } = usePartWords(marks);
  const roots = useMemo(
    () => partTree(shownHarness(harness, circuit, new Set([...marks.cut, ...marks.open]))),
    [harness, circuit, marks],
  );
  const wireWords = ({ run, part }: PartNode) => {
    const mark = run && runMark(run, marks.places);
    return mark && mark !== 'idle' && mark !== partMarks(part, marks.places).feed
      ? [t('wire', { state: t(`mark.${mark}`) })]
      : [];
  };
  const item = (node: PartNode) => (
    <li key={node.part.id}>
      <Row
        part={node.part}
        label={t('numbered', { number: node.number, label: node.part.label })}
        words={[...states(node.part), ...wireWords(node)].join(', ')}
        marks={marks}
        onPick={!pickable || pickable.has(node.part.id) ? onPick : undefined}
      />
      {node.children.length > 0 && <ul>{node.children.map(item)}</ul>}
    </li>
  );
  return (
    <ul className="lw-list" aria-label={t('list', { name: harness.name })}>
      {roots.map(item)}
    </ul>
  );
}

interface RowProps extends Pick<HarnessListProps, 'marks' | 'onPick'> {
  part: Part;
  label: string;
  words: string;
}

function Row({ part, label, words, marks, onPick }: RowProps) {
  const face = (
    <>
      <svg viewBox="-14 -14 28 28" width={28} height={28} aria-hidden>
        <PartSymbol
          part={part}
          marks={partMarks(part, marks.places)}
          size={20}
          open={marks.open.includes(part.id)}
          turn={0}
          ink={1}
        />
      </svg>
      <span className="lw-list-text">
        <span>{label}</span>
        {words && (
          <span className="lw-list-words" style={{ color: colours.muted }}>
            {words}
          </span>
        )}
      </span>
    </>
  );
  return onPick ? (
    <button
      type="button"
      className="lw-list-row"
      style={{ borderColor: colours.edge }}
      onClick={() => onPick(part.id)}
    >
      {face}
    </button>
  ) : (
    <div className="lw-list-row">{face}</div>
  );
}
