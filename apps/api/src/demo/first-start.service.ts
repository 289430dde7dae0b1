import { randomBytes } from 'node:crypto';
import { EntityManager } from '@mikro-orm/better-sqlite';
import { Inject, Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { uuidv7 } from 'uuidv7';
import { hashPassword } from '../auth/passwords';
import { Clock } from '../common/clock';
import { SETTINGS, type Settings } from '../common/settings';
import { DEFAULT_PREFERENCES } from '../people/default-preferences';
import { Person } from '../people/person.entity';
import { seedDemoTraces } from './seed-demo-traces';
import { seedDemoYard } from './seed-demo-yard';

/** An account made at this start, with the password that is shown once. */
export interface FirstLead {
  email: string;
  password: string;
}

const FIRST_LEAD_EMAIL = 'lead@lampwright.example';
const PASSWORD_BYTES = 12;

/** Gives an empty database its first people: the demo yard, or one lead. */
@Injectable()
export class FirstStartService implements OnApplicationBootstrap {
  /** Set where this start made the first lead. */
  firstLead: FirstLead | null = null;

  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    const em = this.em.fork();
    if ((await em.count(Person)) > 0) return;
    await em.transactional(async (inside) => {
      const { demo } = this.settings;
      if (demo === 'none') this.firstLead = await this.createFirstLead(inside);
      else await seedDemoYard(inside, this.clock.now());
      if (demo === 'full') await seedDemoTraces(inside, this.clock.now());
    });
  }

  private async createFirstLead(em: EntityManager): Promise<FirstLead> {
    const password = randomBytes(PASSWORD_BYTES).toString('base64url');
    em.create(Person, {
      id: uuidv7(),
      name: 'First lead',
      email: FIRST_LEAD_EMAIL,
      role: 'lead',
      passwordHash: await hashPassword(password),
      preferences: DEFAULT_PREFERENCES,
      createdAt: this.clock.now(),
    });
    return { email: FIRST_LEAD_EMAIL, password };
  }
}
