import type { CircuitId, Harness } from '@lampwright/harness';
import { DEFAULT_TIMING } from '@lampwright/isolation';
import { useCallback, useEffect, useMemo, useState } from 'react';
import { usePlanner, type CircuitForecast } from '../../../lib/planner';
import { forecastCircuits, outlooksOf, type CircuitOutlook } from './forecast-circuits';

interface Progress {
  of: Harness;
  forecasts: ReadonlyMap<CircuitId, CircuitForecast>;
  done: boolean;
  failure: { error: unknown } | null;
}

const started = (of: Harness): Progress => ({
  of,
  forecasts: new Map(),
  done: false,
  failure: null,
});

export interface Forecasts {
  circuits: CircuitOutlook[];
  /** What went wrong, while that is where it stands. */
  failure: { error: unknown } | null;
  /** True until every circuit is worked out as well as it will be. */
  working: boolean;
  retry: () => void;
}

/** What traces on the circuits of a plan will take, circuit by circuit as they are worked out. */
export function useForecasts(harness: Harness): Forecasts {
  const planner = usePlanner();
  const [attempt, setAttempt] = useState(0);
  const [last, setProgress] = useState<Progress>(() => started(harness));
  const progress = last.of === harness ? last : started(harness);

  useEffect(() => {
    const leaving = new AbortController();
    const change = (part: (before: Progress) => Partial<Progress>) => {
      if (leaving.signal.aborted) return;
      setProgress((before) => {
        const ours = before.of === harness ? before : started(harness);
        return { ...ours, ...part(ours) };
      });
    };
    forecastCircuits(harness, {
      planner,
      timing: DEFAULT_TIMING,
      signal: leaving.signal,
      tell: (circuit, forecast) =>
        change(({ forecasts }) => ({ forecasts: new Map(forecasts).set(circuit, forecast) })),
    }).then(
      () => change(() => ({ done: true })),
      (error: unknown) => change(() => ({ failure: { error } })),
    );
    return () => leaving.abort();
  }, [planner, harness, attempt]);

  const retry = useCallback(() => {
    setProgress((before) => ({ ...before, failure: null }));
    setAttempt((count) => count + 1);
  }, []);
  const { forecasts, failure, done } = progress;
  const circuits = useMemo(
    () =>
      outlooksOf(harness).map((outlook) => ({
        ...outlook,
        forecast: forecasts.get(outlook.circuit) ?? null,
      })),
    [harness, forecasts],
  );
  return { circuits, failure, working: !done && !failure, retry };
}
