import { useId, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { connectedParts } from './connected-parts';
import { CutLines } from './cut-lines';
import { cutsOf } from './cuts';
import './drawing.css';
import { DrawingFooter } from './drawing-footer';
import { FoundWires } from './found-wires';
import { layoutHarness } from './layout/layout-harness';
import { placeFlags } from './layout/place-flags';
import { shortName } from './layout/label-lines';
import { LengthDimension } from './length-dimension';
import type { HarnessDrawingProps } from './marks';
import { OtherParts } from './other-parts';
import { PartLabels } from './part-labels';
import { Parts } from './parts';
import { PickButtons } from './pick-buttons';
import { pictureWords } from './picture-words';
import { ScaleRow } from './scale-row';
import { SheetTexts } from './sheet-texts-group';
import { SuspicionWash } from './suspicion-wash';
import { TrailerOutline } from './trailer-outline';
import { useLabels } from './use-labels';
import { usePartWords } from './use-part-words';
import { useSize } from './use-size';
import { useZoom } from './use-zoom';
import { Wires } from './wires';
import { colours } from './drawing-colours';

const FLAG_HEIGHT = 34;

/** The trailer from above, nose left, with its harness to scale and what is known of it. */
export function HarnessDrawing(props: HarnessDrawingProps) {
  const { harness, circuit, marks, lengths, onPick, pickable, compact = false, trailer } = props;
  const { t } = useTranslation('drawing');
  const washId = useId();
  const [ref, sheet] = useSize<HTMLDivElement>();
  const { transform, settled, ...zoom } = useZoom(ref, sheet);
  const { describe } = usePartWords(marks);

  const kept = [...marks.cut, ...marks.open, ...(pickable ?? [])].sort().join('\n');
  const layout = useMemo(
    () =>
      layoutHarness({
        harness,
        circuit,
        keep: new Set(kept.split('\n')),
        ...(trailer ? { trailer } : {}),
        sheet,
        compact,
      }),
    [harness, circuit, kept, trailer, sheet, compact],
  );
  const connected = useMemo(
    () => connectedParts(layout.parts, layout.runs, marks.open),
    [layout, marks.open],
  );
  const ink = 1 / Math.sqrt(settled);
  const fontSize = Math.min(15, Math.max(12, sheet.width / 48));
  const flagHeight = sheet.height < 400 || compact ? 28 : FLAG_HEIGHT;

  const screen = (id: string) => {
    const at = layout.positions.get(id);
    return at && { x: transform.applyX(at.x), y: transform.applyY(at.y) };
  };
  const { deck } = layout.frame;
  const cuts = cutsOf({
    parts: layout.parts,
    cut: marks.cut,
    screen,
    deck: {
      x: transform.applyX(deck.x),
      y: transform.applyY(deck.y),
      width: deck.width * transform.k,
      height: deck.height * transform.k,
    },
    symbol: layout.symbol * Math.sqrt(transform.k),
    wording: ({ label }, alone) => {
      const code = shortName(label) ?? label;
      const says = (name: string) => t(alone ? 'partHere' : 'partToo', { label: name });
      return [says(code), code];
    },
  });
  const row = { height: flagHeight, left: 6, right: sheet.width - 6 };
  const flags = [
    ...placeFlags(cuts, 'top', { ...row, y: 6 }, fontSize + 2),
    ...placeFlags(cuts, 'bottom', { ...row, y: sheet.height - flagHeight - 6 }, fontSize + 2),
  ];
  const dimensionY =
    !compact && sheet.height >= 400 ? Math.min(sheet.height - 30, deck.y + deck.height + 48) : null;

  const labels = useLabels({
    layout,
    marks,
    pickable,
    few: compact,
    flagged: new Set(flags.map((flag) => flag.id)),
    size: fontSize / settled,
    ink,
    compact,
    dimensionY,
  });
  const points = new Map(
    layout.parts.flatMap((part) => {
      const at = screen(part.id);
      return at && onPick && (!pickable || pickable.has(part.id)) ? [[part.id, at] as const] : [];
    }),
  );

  return (
    <div className="lw-drawing">
      <div className="lw-sheet" ref={ref} style={{ background: colours.paper }}>
        <svg role="img" aria-label={pictureWords(t, harness.name, layout.parts, marks)}>
          <g transform={transform.toString()}>
            <TrailerOutline
              frame={layout.frame}
              bodyType={trailer?.bodyType ?? null}
              lengthMetres={layout.extent.length}
            />
            {!compact && <SheetTexts texts={labels.texts} size={fontSize * 0.9} />}
            {dimensionY !== null && !layout.extent.inferred && (
              <LengthDimension
                deck={deck}
                y={dimensionY}
                lengthMetres={layout.extent.length}
                unit={lengths}
                fontSize={fontSize * 0.95}
              />
            )}
            <SuspicionWash
              id={washId}
              parts={layout.parts}
              runs={layout.runs}
              positions={layout.positions}
              routes={layout.routes}
              places={marks.places}
              width={layout.symbol * 1.5 * ink}
            />
            <OtherParts points={layout.others} ink={ink} />
            <Wires
              runs={layout.runs}
              routes={layout.routes}
              places={marks.places}
              connected={connected}
              ink={ink * layout.weight}
            />
            <FoundWires layout={layout} places={marks.places} ink={ink} />
            <Parts
              layout={layout}
              marks={marks}
              connected={connected}
              offered={pickable ?? new Set()}
              ink={ink}
            />
            <PartLabels
              labels={labels.placed}
              parts={layout.parts}
              positions={layout.positions}
              places={marks.places}
              size={fontSize / settled}
            />
          </g>
          <CutLines cuts={cuts} flags={flags} fontSize={fontSize + 2} />
          {!compact && (
            <ScaleRow
              sheet={sheet}
              alongScale={layout.frame.alongScale * transform.k}
              acrossScale={layout.frame.acrossScale * transform.k}
              unit={lengths}
              fontSize={fontSize * 0.9}
            />
          )}
        </svg>
        {onPick && (
          <PickButtons
            sheet={ref}
            parts={layout.parts}
            points={points}
            describe={describe}
            onPick={onPick}
          />
        )}
      </div>
      {!compact && (
        <DrawingFooter parts={layout.parts} marks={marks} zoom={zoom} wide={sheet.width >= 560} />
      )}
    </div>
  );
}
