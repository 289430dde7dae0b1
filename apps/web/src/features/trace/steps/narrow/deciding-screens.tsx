import type { PartId } from '@lampwright/harness';
import { useCallback, useState } from 'react';
import { useNextPowerUp } from '../../store/use-next-power-up';
import { BarScreen } from './bar-screen';
import { DamageScreen } from './damage-screen';
import { ElseScreen } from './else-screen';
import { FeedChangeScreen } from './feed-change-screen';
import type { NarrowMode } from './narrow-mode';
import { NoAdvice } from './no-advice';
import { PickScreen } from './pick-screen';
import { PlanWrongScreen } from './plan-wrong-screen';
import { PowerUpScreen } from './power-up-screen';

/** The next power-up, and what can be said instead of doing it. */
export function DecidingScreens() {
  const { value: next, failure } = useNextPowerUp();
  const [mode, setMode] = useState<NarrowMode>('powerUp');
  const [touched, setTouched] = useState<PartId | null>(null);
  const pick = useCallback((point: PartId) => {
    setTouched(point);
    setMode('pick');
  }, []);
  const back = () => {
    setTouched(null);
    setMode('powerUp');
  };
  // What is being said stays on the screen while the planner thinks about what was said so far.
  switch (mode) {
    case 'else':
      return <ElseScreen go={setMode} back={back} />;
    case 'plan':
      return <PlanWrongScreen back={back} />;
    case 'damage':
      return <DamageScreen back={back} />;
    case 'feed':
      return <FeedChangeScreen back={back} />;
  }
  if (!next) return <NoAdvice failure={failure} />;
  switch (mode) {
    case 'bar':
      return <BarScreen points={next.toOpen} back={back} />;
    case 'pick':
      return <PickScreen next={next} touched={touched} back={back} />;
    case 'powerUp':
      return <PowerUpScreen next={next} go={setMode} pick={pick} />;
  }
}
