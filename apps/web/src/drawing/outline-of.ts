import type { DrawingTrailer } from './marks';
import type { Box } from './layout/geometry';

export interface Outline {
  body: string;
  /** Thin lines that tell the body from another. */
  details: string;
}

/** The outline of a trailer from above, nose left, by its body; a plain box where the body is not known. */
export function outlineOf(deck: Box, body: DrawingTrailer['bodyType'] | null): Outline {
  const { x, y, width, height } = deck;
  const right = x + width;
  const bottom = y + height;
  const middle = y + height / 2;
  const nose = Math.min(height * 0.045, width * 0.03);
  switch (body) {
    case 'tank': {
      const end = Math.min(height * 0.42, width * 0.12);
      return {
        body: `M${x + end} ${y}H${right - end}C${right - end * 0.2} ${y} ${right} ${y + height * 0.18} ${right} ${middle}C${right} ${bottom - height * 0.18} ${right - end * 0.2} ${bottom} ${right - end} ${bottom}H${x + end}C${x + end * 0.2} ${bottom} ${x} ${bottom - height * 0.18} ${x} ${middle}C${x} ${y + height * 0.18} ${x + end * 0.2} ${y} ${x + end} ${y}Z`,
        details: uprights(deck, 5, 0.2),
      };
    }
    case 'flatbed':
    case 'carHauler':
    case 'utility':
      return { body: box(deck, 3), details: uprights(deck, body === 'flatbed' ? 14 : 8, 0) };
    case 'containerChassis': {
      const rail = height * 0.16;
      return {
        body: box(deck, 3),
        details: `M${x} ${middle - rail}H${right}M${x} ${middle + rail}H${right}${uprights(deck, 5, 0)}`,
      };
    }
    case 'refrigerated':
      return {
        body: van(deck, nose),
        details: `M${x + width * 0.035} ${y + height * 0.2}V${bottom - height * 0.2}${doors(deck)}`,
      };
    default:
      return { body: van(deck, nose), details: doors(deck) };
  }
}

function box({ x, y, width, height }: Box, r: number): string {
  return `M${x + r} ${y}h${width - 2 * r}a${r} ${r} 0 0 1 ${r} ${r}v${height - 2 * r}a${r} ${r} 0 0 1 ${-r} ${r}h${2 * r - width}a${r} ${r} 0 0 1 ${-r} ${-r}v${2 * r - height}a${r} ${r} 0 0 1 ${r} ${-r}z`;
}

function van({ x, y, width, height }: Box, nose: number): string {
  const r = 4;
  return `M${x + nose} ${y}H${x + width - r}a${r} ${r} 0 0 1 ${r} ${r}V${y + height - r}a${r} ${r} 0 0 1 ${-r} ${r}H${x + nose}Q${x - nose} ${y + height / 2} ${x + nose} ${y}z`;
}

function doors({ x, y, width, height }: Box): string {
  const depth = Math.min(4, width * 0.01);
  return `M${x + width - depth} ${y + 5}V${y + height - 5}`;
}

/** Crossmembers or rings: upright lines at even distances, `short` of the edges by that share of the height. */
function uprights({ x, y, width, height }: Box, count: number, short: number): string {
  return Array.from({ length: count }, (_, at) => {
    const place = x + (width * (at + 1)) / (count + 1);
    return `M${place} ${y + height * short}V${y + height * (1 - short)}`;
  }).join('');
}
