import type { Harness } from '@lampwright/harness';
import type { BodyType } from '@lampwright/trace';
import { demoId } from './demoId';
import { carHauler } from './plans/carHauler';
import { containerChassis } from './plans/containerChassis';
import { dryVan } from './plans/dryVan';
import { flatbed } from './plans/flatbed';
import { pup } from './plans/pup';
import { refrigerated } from './plans/refrigerated';
import { tank } from './plans/tank';
import { utility } from './plans/utility';

export interface DemoPlan {
  id: string;
  harness: Harness;
}

/** One plan for each kind of trailer in the yard. */
export const plans: Record<BodyType, DemoPlan> = {
  dryVan: { id: demoId('plan', 1), harness: dryVan() },
  flatbed: { id: demoId('plan', 2), harness: flatbed() },
  pup: { id: demoId('plan', 3), harness: pup() },
  containerChassis: { id: demoId('plan', 4), harness: containerChassis() },
  refrigerated: { id: demoId('plan', 5), harness: refrigerated() },
  carHauler: { id: demoId('plan', 6), harness: carHauler() },
  tank: { id: demoId('plan', 7), harness: tank() },
  utility: { id: demoId('plan', 8), harness: utility() },
};
