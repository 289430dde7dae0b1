import { isAt } from '@lampwright/trace';
import { useTraceLog } from '../../store/trace-session';
import { ContradictionScreen } from './contradiction-screen';
import { CoolDownScreen } from './cool-down-screen';
import { DecidingScreens } from './deciding-screens';

/** The loop: one power-up after another until the section is known. */
export function NarrowStep() {
  const contradicted = useTraceLog((log) => isAt(log, 'contradicted'));
  const hot = useTraceLog((log) => isAt(log, 'coolDown'));
  if (contradicted) return <ContradictionScreen />;
  if (hot) return <CoolDownScreen />;
  return <DecidingScreens />;
}
