import { useId, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { connectedParts } from './connected-parts';
import { CutFlags } from './cut-flags';
import { CutLines } from './cut-lines';
import { cutsOf } from './cuts';
import './drawing.css';
import { DrawingFooter } from './drawing-footer';
import { FoundWires } from './found-wires';
import type { Point } from './layout/geometry';
import { layoutHarness } from './layout/layout-harness';
import { placeFlags } from './layout/place-flags';
import { shortLabel, shortName } from './layout/label-lines';
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

/** The trailer from above, nose left, with its harness to scale and what is known of it. */
export function HarnessDrawing(props: HarnessDrawingProps) {
  const {
    harness,
    circuit,
    marks,
    lengths,
    onPick,
    pickable,
    compact = false,
    trailer,
    tools,
  } = props;
  const { t } = useTranslation('drawing');
  const washId = useId();
  const [ref, sheet] = useSize<HTMLDivElement>();
  const { transform, settled, ...zoom } = useZoom(ref, sheet, !compact);
  const { describe } = usePartWords(marks);

  const kept = JSON.stringify([...marks.cut, ...marks.open].sort());
  const layout = useMemo(
    () =>
      layoutHarness({
        harness,
        circuit,
        keep: new Set(JSON.parse(kept) as string[]),
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
  const fontSize = compact ? 11 : Math.min(15, Math.max(12, sheet.width / 48));

  const screen = new Map(
    [...layout.positions].map(([id, at]): [string, Point] => [
      id,
      { x: transform.applyX(at.x), y: transform.applyY(at.y) },
    ]),
  );
  const { deck } = layout.frame;
  const roomy = !compact && sheet.height >= 400;
  const cuts = cutsOf({
    parts: layout.parts,
    cut: marks.cut,
    screen,
    turn: (id) => layout.turns.get(id) ?? 0,
    deck: {
      x: transform.applyX(deck.x),
      y: transform.applyY(deck.y),
      width: deck.width * transform.k,
      height: deck.height * transform.k,
    },
    symbol: layout.symbol * Math.sqrt(transform.k),
    below: roomy,
    wording: ({ label }, alone) => {
      const code = shortName(label) ?? label;
      return [t(alone ? 'partHere' : 'partToo', { label: code }), code, shortLabel(code)];
    },
  });
  const row = { height: roomy ? 34 : compact ? 22 : 28, left: 6, right: sheet.width - 6 };
  const flags = [
    ...placeFlags(cuts, 'top', { ...row, y: compact ? 2 : 6 }, fontSize + 2),
    ...placeFlags(cuts, 'bottom', { ...row, y: sheet.height - row.height - 24 }, fontSize + 2),
  ];
  const flagBelow = flags.some((flag) => flag.edge === 'bottom');
  const under = deck.y + deck.height + 34;
  const dimensionY =
    roomy && !flagBelow && !layout.extent.inferred && under <= sheet.height - 38 ? under : null;

  const labels = useLabels({
    layout,
    marks,
    pickable,
    few: compact,
    flags,
    size: fontSize / settled,
    ink,
    compact,
    dimensionY,
  });
  const points = new Map(
    [...screen].filter(([id]) => onPick !== undefined && (!pickable || pickable.has(id))),
  );

  return (
    <div className="lw-drawing">
      <div
        className="lw-sheet"
        ref={ref}
        style={{ background: colours.paper, touchAction: compact ? 'auto' : 'none' }}
      >
        <svg role="img" aria-label={pictureWords(t, harness.name, layout.parts, marks)}>
          <g transform={transform.toString()}>
            <TrailerOutline
              frame={layout.frame}
              bodyType={trailer?.bodyType ?? null}
              lengthMetres={layout.extent.length}
            />
            {!compact && <SheetTexts texts={labels.texts} size={fontSize * 0.9} />}
            {dimensionY !== null && (
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
              hatch={1 / settled}
            />
            <OtherParts points={layout.others} ink={ink * layout.weight} />
            <Wires
              runs={layout.runs}
              routes={layout.routes}
              places={marks.places}
              connected={connected}
              ink={ink * layout.weight}
            />
            <FoundWires layout={layout} places={marks.places} ink={ink} />
          </g>
          <CutLines cuts={cuts} flags={flags} />
          <g transform={transform.toString()}>
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
          <CutFlags flags={flags} fontSize={fontSize + 2} />
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
        <DrawingFooter parts={layout.parts} marks={marks} zoom={zoom} wide={sheet.width >= 560}>
          {tools}
        </DrawingFooter>
      )}
    </div>
  );
}
