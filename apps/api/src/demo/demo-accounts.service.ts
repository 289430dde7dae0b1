import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import type { DemoDto } from '@lampwright/contracts';
import { demoYard } from '@lampwright/demo';
import { verifyPassword } from '../auth/passwords';
import { Person } from '../people/person.entity';
import { DEMO_PASSWORD } from './demo-password';

const DEMO_IDS = demoYard.people.map(({ id }) => id);

/** Finds the demo accounts that anybody can still use. */
@Injectable()
export class DemoAccountsService {
  /** What was found out about each password hash, since finding out is slow by design. */
  private readonly published = new Map<string, boolean>();

  constructor(private readonly em: EntityManager) {}

  /** Open demo accounts whose password is still the published one, in the order of the demo yard; or nobody. */
  async read(): Promise<DemoDto> {
    const people = await this.em
      .fork()
      .find(
        Person,
        { id: { $in: DEMO_IDS }, closed: false },
        { populate: ['passwordHash'], orderBy: { id: 'asc' } },
      );
    const usable: DemoDto['people'] = [];
    for (const { name, email, role, passwordHash } of people) {
      if (await this.isPublished(passwordHash)) usable.push({ name, email, role });
    }
    return { people: usable, password: usable.length > 0 ? DEMO_PASSWORD : '' };
  }

  private async isPublished(hash: string): Promise<boolean> {
    const known = this.published.get(hash);
    if (known !== undefined) return known;
    const answer = await verifyPassword(hash, DEMO_PASSWORD);
    this.published.set(hash, answer);
    return answer;
  }
}
