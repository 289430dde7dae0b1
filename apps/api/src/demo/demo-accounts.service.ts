import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { demoYard } from '@lampwright/demo';
import { verifyPassword } from '../auth/passwords';
import { Person } from '../people/person.entity';
import { DEMO_PASSWORD } from './demo-password';

type DemoPerson = Pick<Person, 'name' | 'email' | 'role'>;

/** Finds the demo accounts that anybody can still use. */
@Injectable()
export class DemoAccountsService {
  private found: Promise<DemoPerson[]> | null = null;

  constructor(private readonly em: EntityManager) {}

  /**
   * Open demo accounts whose password is still the published one, leads first. Looked up once a start: a hash an
   * account is too dear for a route that strangers may call.
   */
  list(): Promise<DemoPerson[]> {
    this.found ??= this.look();
    return this.found;
  }

  private async look(): Promise<DemoPerson[]> {
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
