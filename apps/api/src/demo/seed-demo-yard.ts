import type { EntityManager } from '@mikro-orm/better-sqlite';
import { demoYard } from '@lampwright/demo';
import { uuidv7 } from 'uuidv7';
import { hashPassword } from '../auth/passwords';
import { DEFAULT_PREFERENCES } from '../people/default-preferences';
import { Person } from '../people/person.entity';
import { Plan } from '../plans/plan.entity';
import { PlanRevision } from '../plans/plan-revision.entity';
import { Trailer } from '../trailers/trailer.entity';
import { DEMO_PASSWORD } from './demo-password';

/** Fills an empty database with the demo yard: people, plans and trailers. */
export async function seedDemoYard(em: EntityManager, now: Date): Promise<void> {
  for (const person of demoYard.people) {
    em.create(Person, {
      ...person,
      passwordHash: await hashPassword(DEMO_PASSWORD),
      preferences: DEFAULT_PREFERENCES,
      createdAt: now,
    });
  }
  for (const { id, harness } of demoYard.plans) {
    em.create(Plan, {
      id,
      name: harness.name,
      revision: 1,
      parts: harness.parts.length,
      circuits: harness.circuits.length,
      createdAt: now,
      updatedAt: now,
    });
    em.create(PlanRevision, {
      id: uuidv7(),
      plan: em.getReference(Plan, id),
      number: 1,
      harness,
      author: null,
      createdAt: now,
    });
  }
  for (const { planId, secondSources, ...trailer } of demoYard.trailers) {
    em.create(Trailer, {
      ...trailer,
      secondSources: [...secondSources],
      plan: em.getReference(Plan, planId),
    });
  }
  await em.flush();
}
