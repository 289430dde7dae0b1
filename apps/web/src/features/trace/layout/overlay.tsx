import type { CircuitId, PartId } from '@lampwright/harness';
import type { LampResult } from '@lampwright/trace';
import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';

/** What the panel of the moment wants on the drawing beside the state of the trace. */
export interface Overlay {
  /** Points that are to be parted next. */
  cut?: readonly PartId[];
  circuit?: CircuitId;
  lamps?: ReadonlyMap<PartId, LampResult>;
  pickable?: ReadonlySet<PartId>;
  onPick?: (part: PartId) => void;
}

interface OverlayState {
  overlay: Overlay;
  setOverlay: (overlay: Overlay) => void;
}

const NOTHING: Overlay = {};
const OverlayContext = createContext<OverlayState>({
  overlay: NOTHING,
  setOverlay: () => undefined,
});

export function OverlayProvider({ children }: { children: ReactNode }) {
  const [overlay, setOverlay] = useState(NOTHING);
  const state = useMemo(() => ({ overlay, setOverlay }), [overlay]);
  return <OverlayContext value={state}>{children}</OverlayContext>;
}

export function useOverlay(): Overlay {
  return useContext(OverlayContext).overlay;
}

/** Shows `overlay`, which the caller keeps the same while it says the same, until the caller is gone. */
export function useShowOnDrawing(overlay: Overlay): void {
  const { setOverlay } = useContext(OverlayContext);
  useEffect(() => {
    setOverlay(overlay);
    return () => setOverlay(NOTHING);
  }, [overlay, setOverlay]);
}
