import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { demoYard } from '@lampwright/demo';
import { verifyPassword } from '../auth/passwords';
import { Person } from '../people/person.entity';
import { DEMO_PASSWORD } from './demo-password';

/** Finds the demo accounts that anybody can still use. */
@Injectable()
export class DemoAccountsService {
  constructor(private readonly em: EntityManager) {}

  /** Open demo accounts whose password is still the published one, leads first. */
  async list(): Promise<Pick<Person, 'name' | 'email' | 'role'>[]> {
    const people = await this.em
      .fork()
      .find(
        Person,
        { id: { $in: demoYard.people.map(({ id }) => id) }, closed: false },
        { populate: ['passwordHash'], orderBy: { role: 'asc', name: 'asc' } },
      );
    const open: Person[] = [];
    for (const person of people) {
      if (await verifyPassword(person.passwordHash, DEMO_PASSWORD)) open.push(person);
    }
    return open;
  }
}
