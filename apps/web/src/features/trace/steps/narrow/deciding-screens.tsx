import type { PartId } from '@lampwright/harness';
import { useCallback, useState } from 'react';
import { Panel, PanelBody, Text } from '../../controls/panel';
import { useNextPowerUp } from '../../store/use-next-power-up';
import { useTraceWords } from '../../words/use-trace-words';
import { BarScreen } from './bar-screen';
import { DamageScreen } from './damage-screen';
import { ElseScreen } from './else-screen';
import { FeedChangeScreen } from './feed-change-screen';
import type { NarrowMode } from './narrow-mode';
import { PickScreen } from './pick-screen';
import { PlanWrongScreen } from './plan-wrong-screen';
import { PowerUpScreen } from './power-up-screen';

/** The next power-up, and what can be said instead of doing it. */
export function DecidingScreens() {
  const t = useTraceWords();
  const next = useNextPowerUp();
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
  if (!next) {
    return (
      <Panel>
        <PanelBody>
          <Text>{t('narrow.working')}</Text>
        </PanelBody>
      </Panel>
    );
  }
  switch (mode) {
    case 'bar':
      return <BarScreen points={next.toOpen} back={back} />;
    case 'pick':
      return <PickScreen next={next} touched={touched} back={back} />;
    case 'else':
      return <ElseScreen go={setMode} back={back} />;
    case 'plan':
      return <PlanWrongScreen back={back} />;
    case 'damage':
      return <DamageScreen back={back} />;
    case 'feed':
      return <FeedChangeScreen back={back} />;
    default:
      return <PowerUpScreen next={next} go={setMode} pick={pick} />;
  }
}
