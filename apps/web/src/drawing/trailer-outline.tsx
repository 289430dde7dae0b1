import type { DrawingTrailer } from './marks';
import { colours } from './drawing-colours';
import type { Frame } from './layout/frame';
import type { Box } from './layout/geometry';
import { outlineOf } from './outline-of';

interface Props {
  frame: Frame;
  bodyType: DrawingTrailer['bodyType'] | null;
  lengthMetres: number;
}

/** The trailer from above: outline, centre line, a hint of the axles and the kingpin, and the faces folded out. */
export function TrailerOutline({ frame, bodyType, lengthMetres }: Props) {
  const { deck } = frame;
  const middle = deck.y + deck.height / 2;
  const outline = outlineOf(deck, bodyType);
  return (
    <g aria-hidden className="lw-outline" fill="none" stroke={colours.ink}>
      {[frame.front, frame.rear].map((face) => face && <Face key={face.x} box={face} />)}
      <path d={outline.body} fill={colours.sheet} stroke="none" />
      <Axles frame={frame} lengthMetres={lengthMetres} bodyType={bodyType} />
      <path d={outline.details} stroke={colours.line} strokeWidth={1.25} />
      <path
        d={`M${deck.x - 10} ${middle}H${deck.x + deck.width + 10}`}
        stroke={colours.edge}
        strokeWidth={0.75}
        strokeDasharray="18 4 3 4"
        opacity={0.55}
      />
      <path d={outline.body} strokeWidth={2} strokeLinejoin="round" />
    </g>
  );
}

function Face({ box }: { box: Box }) {
  return (
    <rect
      {...box}
      rx={3}
      fill={colours.sheet}
      fillOpacity={0.6}
      stroke={colours.edge}
      strokeWidth={1.25}
      strokeDasharray="6 4"
    />
  );
}

/** Wheels 1.25 m apart and a kingpin 0.91 m behind the nose: common practice, no source. The plan does not say. */
function Axles({ frame, lengthMetres, bodyType }: Props) {
  const { deck, alongScale } = frame;
  const tyre = { width: Math.min(1 * alongScale, deck.width / 7), height: deck.height * 0.07 };
  const places =
    lengthMetres < 6
      ? [lengthMetres * 0.6]
      : lengthMetres < 9.5
        ? [lengthMetres - 1.5]
        : [lengthMetres - 3.05, lengthMetres - 1.8];
  const rows = [deck.y + deck.height * 0.035, deck.y + deck.height * 0.895];
  return (
    <g fill={colours.sunken} stroke={colours.line} strokeWidth={1}>
      {places.flatMap((along) =>
        rows.map((y) => (
          <rect
            key={`${along} ${y}`}
            x={deck.x + along * alongScale - tyre.width / 2}
            y={y}
            {...tyre}
            rx={3}
          />
        )),
      )}
      {lengthMetres >= 6 && bodyType !== 'utility' && (
        <circle
          cx={deck.x + 0.91 * alongScale}
          cy={deck.y + deck.height / 2}
          r={Math.min(7, deck.height * 0.03)}
        />
      )}
    </g>
  );
}
