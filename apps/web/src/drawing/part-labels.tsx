import type { Part } from '@lampwright/harness';
import { colours } from './drawing-colours';
import type { Point } from './layout/geometry';
import { LINE_HEIGHT, type PlacedLabel } from './layout/place-labels';
import type { DrawingMarks } from './marks';
import { partMarks } from './place-marks';

interface Props {
  labels: readonly PlacedLabel[];
  parts: readonly Part[];
  positions: ReadonlyMap<string, Point>;
  places: DrawingMarks['places'];
  size: number;
}

/** The labels that found a place, each with a halo so that a wire under it does not cut the letters. */
export function PartLabels({ labels, parts, positions, places, size }: Props) {
  const partById = new Map(parts.map((part) => [part.id, part]));
  return (
    <g style={{ fontSize: size }} aria-hidden>
      {labels.map((label) => {
        const part = partById.get(label.id);
        const at = positions.get(label.id);
        if (!part || !at) return null;
        const mark = partMarks(part, places).whole;
        const fill =
          mark === 'found'
            ? colours.emberText
            : mark === 'cleared'
              ? colours.slateText
              : colours.ink;
        const { box } = label;
        const middle = box.x + box.width / 2;
        return (
          <g key={label.id} data-label={label.id}>
            {label.leader && (
              <path
                d={`M${at.x} ${at.y}L${clampTo(at.x, box.x, box.width)} ${clampTo(at.y, box.y, box.height)}`}
                stroke={colours.edge}
                strokeWidth={size / 15}
              />
            )}
            {label.bold && (
              <rect
                x={box.x - size * 0.25}
                y={box.y - size * 0.04}
                width={box.width + size * 0.5}
                height={box.height + size * 0.08}
                rx={size * 0.25}
                fill={mark === 'found' ? colours.emberWash : colours.paper}
                opacity={0.94}
              />
            )}
            <text
              fill={fill}
              stroke={label.bold ? 'none' : colours.paper}
              strokeWidth={size * 0.26}
              strokeLinejoin="round"
              paintOrder="stroke"
              style={{ fontWeight: label.bold ? 700 : mark === 'inQuestion' ? 600 : 400 }}
              textAnchor="middle"
            >
              {label.lines.map((line, index) => (
                <tspan key={line} x={middle} y={box.y + size * (0.92 + index * LINE_HEIGHT)}>
                  {line}
                </tspan>
              ))}
            </text>
          </g>
        );
      })}
    </g>
  );
}

function clampTo(value: number, low: number, length: number): number {
  return Math.min(Math.max(value, low), low + length);
}
