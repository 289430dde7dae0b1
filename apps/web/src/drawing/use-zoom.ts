import { select } from 'd3-selection';
import { zoom, zoomIdentity, type ZoomBehavior, type ZoomTransform } from 'd3-zoom';
import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';
import type { Size } from './layout/frame';

const CLOSEST = 8;
const STEP = 1.6;

export interface Zoom {
  transform: ZoomTransform;
  /** The scale at rest: it follows when a gesture ends, so that labels are not placed anew at every move. */
  settled: number;
  closer: () => void;
  further: () => void;
  fit: () => void;
}

/** Pinch, wheel and drag on an element, and the same by buttons. The sheet never leaves its frame. While not `enabled` the page scrolls over it. */
export function useZoom(
  ref: RefObject<HTMLElement | null>,
  { width, height }: Size,
  enabled: boolean,
): Zoom {
  const [transform, setTransform] = useState<ZoomTransform>(zoomIdentity);
  const [settled, setSettled] = useState(1);
  const behaviour = useRef<ZoomBehavior<HTMLElement, unknown> | null>(null);

  useEffect(() => {
    const element = ref.current;
    if (!element || !enabled) return;
    const all: [[number, number], [number, number]] = [
      [0, 0],
      [width, height],
    ];
    const zooming = zoom<HTMLElement, unknown>()
      .scaleExtent([1, CLOSEST])
      .extent(all)
      .translateExtent(all)
      .on('zoom', (event: { transform: ZoomTransform }) => setTransform(event.transform))
      .on('end', (event: { transform: ZoomTransform }) => setSettled(event.transform.k));
    behaviour.current = zooming;
    const selection = select(element);
    selection.call(zooming).on('dblclick.zoom', null);
    selection.call(zooming.transform, zoomIdentity);
    return () => {
      selection.on('.zoom', null);
    };
  }, [ref, width, height, enabled]);

  const scaleBy = useCallback(
    (factor: number) => {
      if (ref.current) behaviour.current?.scaleBy(select(ref.current), factor);
    },
    [ref],
  );
  const fit = useCallback(() => {
    if (ref.current) behaviour.current?.transform(select(ref.current), zoomIdentity);
  }, [ref]);
  const closer = useCallback(() => scaleBy(STEP), [scaleBy]);
  const further = useCallback(() => scaleBy(1 / STEP), [scaleBy]);
  return { transform, settled, closer, further, fit };
}
