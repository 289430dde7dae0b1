import { misnumberedPlans } from './amounts';
import type { MalformedPlan } from './damage';
import { contradictoryPlans } from './references';
import { misshapenPlans } from './shapes';
import { unreadableTexts } from './texts';
import { misfedPlans } from './trees';

/** Plans that the reader refuses, each with exactly the faults that it deserves. */
export const malformedPlans: readonly MalformedPlan[] = [
  ...unreadableTexts,
  ...misshapenPlans,
  ...misnumberedPlans,
  ...contradictoryPlans,
  ...misfedPlans,
];
