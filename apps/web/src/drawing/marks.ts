import type { CircuitId, Harness, PartId } from '@lampwright/harness';
import type { BodyType, LampResult } from '@lampwright/trace';
import type { ReactNode } from 'react';

/** What is known of one place. `idle` is a place that no question is about. */
export type PlaceMark = 'inQuestion' | 'cleared' | 'found' | 'idle';

/** What the drawing says on top of the plan. Everything that is not named here is drawn as `idle`. */
export interface DrawingMarks {
  /** The parts to be opened for the next power-up: the amber line goes across these. */
  cut: readonly PartId[];
  /** The parts that are open now, drawn with a visible gap. */
  open: readonly PartId[];
  /** By `placeKey` of `@lampwright/harness`: runs, parts, and the halves of a separable plug. */
  places: ReadonlyMap<string, PlaceMark>;
  /** Results of the lamp check, drawn over the lamps. */
  lamps?: ReadonlyMap<PartId, LampResult>;
}

/** The trailer's outline where it is known; a size that is not given follows from the parts. */
export interface DrawingTrailer {
  lengthMetres?: number;
  widthMetres?: number;
  bodyType: BodyType;
}

export type LengthUnit = 'feet' | 'metres';

/** What the picture and its text twin are both about. */
export interface HarnessView {
  harness: Harness;
  /** `null` shows every circuit. */
  circuit: CircuitId | null;
  marks: DrawingMarks;
  /** Called with the part that was tapped, clicked or chosen by keyboard. */
  onPick?: (part: PartId) => void;
  /** The parts that may be picked; without it, every part when `onPick` is given. */
  pickable?: ReadonlySet<PartId>;
}

export interface HarnessDrawingProps extends HarnessView {
  /** The unit of the scale bar. */
  lengths: LengthUnit;
  /** Leaves out the legend, the zoom and all labels but those of the cut, the find and what is open. */
  compact?: boolean;
  trailer?: DrawingTrailer;
  /** A button that stands beside those of the zoom. */
  tools?: ReactNode;
}

export type HarnessListProps = HarnessView;

/** One place in the suspicion bar. */
export interface SuspicionSlice {
  key: string;
  label: string;
  /** 0 to 1; the slices need not sum to 1. */
  probability: number;
  state: 'inQuestion' | 'cleared';
}

export interface SuspicionBarProps {
  slices: readonly SuspicionSlice[];
}
