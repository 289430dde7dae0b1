import { usePoints } from './use-points';
import { BarScreen } from './bar-screen';

/** The plan shows a point that the trailer does not have, or that is no plug: it is taken out of this trace. */
export function PlanWrongScreen({ back }: { back: () => void }) {
  const { parts } = usePoints();
  return <BarScreen points={parts.map(({ id }) => id)} plan back={back} />;
}
