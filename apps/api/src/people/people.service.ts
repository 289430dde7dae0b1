import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import type { Page } from '@lampwright/contracts';
import { uuidv7 } from 'uuidv7';
import { hashPassword } from '../auth/passwords';
import { SessionsService } from '../auth/sessions.service';
import { Clock } from '../common/clock';
import { FIELD_MESSAGES } from '../common/messages';
import type { PageQueryDto } from '../common/page-query.dto';
import { containing, pageRequest, toPage } from '../common/paging';
import { ProblemException } from '../common/problem.exception';
import { DEFAULT_PREFERENCES } from './default-preferences';
import { toPersonDto, type PersonDto } from './dto/person.dto';
import type { CreatePersonDto, UpdatePersonDto } from './dto/write-person.dto';
import { Person } from './person.entity';

const SORTABLE = {
  name: (name: 'asc' | 'desc') => ({ name }),
  email: (email: 'asc' | 'desc') => ({ email }),
  role: (role: 'asc' | 'desc') => ({ role }),
  lastSignInAt: (lastSignInAt: 'asc' | 'desc') => ({ lastSignInAt }),
};

/** The accounts of the yard. */
@Injectable()
export class PeopleService {
  constructor(
    private readonly em: EntityManager,
    private readonly sessions: SessionsService,
    private readonly clock: Clock,
  ) {}

  async list(query: PageQueryDto): Promise<Page<PersonDto>> {
    const pattern = query.search && containing(query.search);
    const found = await this.em.findAndCount(
      Person,
      pattern ? { $or: [{ name: { $like: pattern } }, { email: { $like: pattern } }] } : {},
      pageRequest(query, SORTABLE, 'name'),
    );
    return toPage(found, query, toPersonDto);
  }

  async create({ name, email, role, password }: CreatePersonDto): Promise<Person> {
    const passwordHash = await hashPassword(password);
    const address = email.trim().toLowerCase();
    if (await this.em.findOne(Person, { email: address })) {
      throw ProblemException.field('conflict', 'email', 'emailTaken', FIELD_MESSAGES.emailTaken);
    }
    const person = this.em.create(Person, {
      id: uuidv7(),
      name: name.trim(),
      email: address,
      role,
      passwordHash,
      preferences: DEFAULT_PREFERENCES,
      createdAt: this.clock.now(),
    });
    await this.em.flush();
    return person;
  }

  async update(id: string, { name, role }: UpdatePersonDto): Promise<Person> {
    return this.em.transactional(async (em) => {
      const person = await em.findOneOrFail(Person, id);
      if (name !== undefined) person.name = name.trim();
      if (role !== undefined && role !== person.role) {
        await this.assertLeadRemains(em, person);
        person.role = role;
      }
      return person;
    });
  }

  /** Closes an account and ends all its sessions. */
  async close(id: string): Promise<Person> {
    return this.em.transactional(async (em) => {
      const person = await em.findOneOrFail(Person, id);
      await this.assertLeadRemains(em, person);
      person.closed = true;
      await this.sessions.endAll(person.id);
      return person;
    });
  }

  async reopen(id: string): Promise<Person> {
    const person = await this.em.findOneOrFail(Person, id);
    person.closed = false;
    await this.em.flush();
    return person;
  }

  /** @throws NotFoundError when nobody has the id. */
  async requireExisting(id: string): Promise<void> {
    await this.em.findOneOrFail(Person, id);
  }

  /** Before `person` stops being an open lead: somebody else must be one. */
  private async assertLeadRemains(em: EntityManager, person: Person): Promise<void> {
    if (person.role !== 'lead' || person.closed) return;
    const others = await em.count(Person, { role: 'lead', closed: false, id: { $ne: person.id } });
    if (others === 0) throw new ProblemException('lastLead');
  }
}
