import type { CircuitId, Harness, Part, PartId, Run, RunId } from '@lampwright/harness';
import type { DrawingTrailer } from '../marks';
import { extentOf, type Extent } from './extent';
import { zonesOf, type Zone } from './faces';
import { frameOf, wholeOf, type Frame, type Margins, type Size } from './frame';
import { clamp, growBox, type Point } from './geometry';
import { routeRuns } from './route';
import { separate } from './separate';
import { shownHarness } from './shown-circuit';
import { turnOf } from './turn-of';

export interface LayoutInput {
  harness: Harness;
  circuit: CircuitId | null;
  /** Parts that are shown though they are not on the circuit. */
  keep: ReadonlySet<PartId>;
  trailer?: DrawingTrailer;
  sheet: Size;
  compact: boolean;
}

/** Where everything lies on the sheet, in pixels at fit scale. What is known of the fault does not move it. */
export interface DrawingLayout {
  sheet: Size;
  extent: Extent;
  frame: Frame;
  parts: Part[];
  runs: Run[];
  positions: ReadonlyMap<PartId, Point>;
  routes: ReadonlyMap<RunId, Point[]>;
  /** By part, degrees by which its feed side is turned from the left. */
  turns: ReadonlyMap<PartId, number>;
  /** Parts of other circuits, as dots. */
  others: Point[];
  /** Side of the square that a symbol fills. */
  symbol: number;
  /** Line widths as a share of their usual ones: thinner where symbols are small. */
  weight: number;
}

/** Lays out one plan, or one circuit of it, on a sheet. Pure; the same input gives the same layout. */
export function layoutHarness(input: LayoutInput): DrawingLayout {
  const { harness, sheet, compact } = input;
  const shown = shownHarness(harness, input.circuit, input.keep);
  const extent = extentOf(harness.parts, input.trailer);
  const zones = zonesOf(shown.parts, extent);
  const frame = frameOf(extent, sheet, marginsOf(sheet, compact), {
    front: has(zones, 'front') ? clamp(sheet.width * 0.12, 38, 92) : 0,
    rear: has(zones, 'rear') ? clamp(sheet.width * 0.17, 50, 132) : 0,
  });
  const separation = separate(shown.parts, zones, frame, largestSymbol(sheet));
  const routes = routeRuns({
    runs: shown.runs,
    positions: separation.positions,
    lanes: separation.lanes,
    symbol: separation.symbol,
    bounds: growBox(wholeOf(frame), 1),
  });
  return {
    sheet,
    extent,
    frame,
    parts: shown.parts,
    runs: shown.runs,
    positions: separation.positions,
    routes,
    turns: new Map(
      shown.runs.map((run) => [run.to, turnOf(routes.get(run.id), separation.symbol)]),
    ),
    others: shown.others.map((part) => ({
      x: frame.deck.x + part.at.along * frame.alongScale,
      y: frame.deck.y + frame.deck.height / 2 - part.at.across * frame.acrossScale,
    })),
    symbol: separation.symbol,
    weight: clamp(separation.symbol / 19, 0.25, 1),
  };
}

function has(zones: ReadonlyMap<PartId, Zone>, zone: Zone): boolean {
  return [...zones.values()].includes(zone);
}

/** Room above for the flags of the cut, below for the scale, and around for labels. */
function marginsOf(sheet: Size, compact: boolean): Margins {
  const side = compact ? 8 : clamp(sheet.width * 0.035, 21, 30);
  if (compact) return { top: 32, right: side, bottom: 10, left: side };
  const top = clamp(sheet.height * 0.16, 40, 84);
  return { top, right: side, bottom: clamp(sheet.height * 0.18, 48, 92), left: side };
}

function largestSymbol(sheet: Size): number {
  return clamp(Math.min(sheet.width / 26, sheet.height / 15), 13, 26);
}
