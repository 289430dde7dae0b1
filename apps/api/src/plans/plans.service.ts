import { EntityManager } from '@mikro-orm/better-sqlite';
import { UniqueConstraintViolationException } from '@mikro-orm/core';
import { Injectable } from '@nestjs/common';
import type { Page } from '@lampwright/contracts';
import { uuidv7 } from 'uuidv7';
import { Clock } from '../common/clock';
import { FIELD_MESSAGES } from '../common/messages';
import type { PageQueryDto } from '../common/page-query.dto';
import { containing, pageRequest, toPage } from '../common/paging';
import { ProblemException } from '../common/problem.exception';
import type { Person } from '../people/person.entity';
import { toPlanDto, toPlanSummaryDto, type PlanDto, type PlanSummaryDto } from './dto/plan.dto';
import { Plan } from './plan.entity';
import { PlanRevision } from './plan-revision.entity';
import { requireHarness } from './require-harness';

const SORTABLE = {
  name: (name: 'asc' | 'desc') => ({ name }),
  parts: (parts: 'asc' | 'desc') => ({ parts }),
  circuits: (circuits: 'asc' | 'desc') => ({ circuits }),
  updatedAt: (updatedAt: 'asc' | 'desc') => ({ updatedAt }),
};

/** Plans and their revisions. */
@Injectable()
export class PlansService {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async list(query: PageQueryDto): Promise<Page<PlanSummaryDto>> {
    const found = await this.em.findAndCount(
      Plan,
      query.search ? { name: { $like: containing(query.search) } } : {},
      pageRequest(query, SORTABLE, 'name'),
    );
    return toPage(found, query, toPlanSummaryDto);
  }

  /** A plan in one of its revisions, by default the newest. */
  async read(id: string, number?: number): Promise<PlanDto> {
    const plan = await this.em.findOneOrFail(Plan, id);
    const revision = await this.em.findOneOrFail(
      PlanRevision,
      { plan, number: number ?? plan.revision },
      { populate: ['harness'] },
    );
    return toPlanDto(plan, revision);
  }

  /** @throws ProblemException `planFaults` with every fault of the document. */
  async create(document: unknown, author: Person): Promise<PlanDto> {
    const harness = requireHarness(document);
    const now = this.clock.now();
    const plan = this.em.create(Plan, {
      id: uuidv7(),
      name: harness.name,
      revision: 1,
      parts: harness.parts.length,
      circuits: harness.circuits.length,
      createdAt: now,
      updatedAt: now,
    });
    const revision = this.em.create(PlanRevision, {
      id: uuidv7(),
      plan,
      number: 1,
      harness,
      author,
      createdAt: now,
    });
    await this.em.flush();
    return toPlanDto(plan, revision);
  }

  /** Adds a revision. Traces go on with the one they were opened on. */
  async revise(id: string, document: unknown, author: Person): Promise<PlanDto> {
    const harness = requireHarness(document);
    const plan = await this.em.findOneOrFail(Plan, id);
    const now = this.clock.now();
    this.em.assign(plan, {
      name: harness.name,
      revision: plan.revision + 1,
      parts: harness.parts.length,
      circuits: harness.circuits.length,
      updatedAt: now,
    });
    const revision = this.em.create(PlanRevision, {
      id: uuidv7(),
      plan,
      number: plan.revision,
      harness,
      author,
      createdAt: now,
    });
    await this.flushRevision();
    return toPlanDto(plan, revision);
  }

  private async flushRevision(): Promise<void> {
    try {
      await this.em.flush();
    } catch (error) {
      if (!(error instanceof UniqueConstraintViolationException)) throw error;
      throw ProblemException.field(
        'conflict',
        'revision',
        'revisionTaken',
        FIELD_MESSAGES.revisionTaken,
      );
    }
  }
}
