import { EntityManager } from '@mikro-orm/better-sqlite';
import { OptimisticLockError } from '@mikro-orm/core';
import { Injectable } from '@nestjs/common';
import type { Page } from '@lampwright/contracts';
import { uuidv7 } from 'uuidv7';
import { FIELD_MESSAGES } from '../common/messages';
import { containing, pageRequest, toPage } from '../common/paging';
import { ProblemException } from '../common/problem.exception';
import { Plan } from '../plans/plan.entity';
import { Trace } from '../traces/trace.entity';
import { toTrailerDto, type TrailerDto } from './dto/trailer.dto';
import type { TrailerListQueryDto } from './dto/trailer-list-query.dto';
import type { UpdateTrailerDto, WriteTrailerDto } from './dto/write-trailer.dto';
import { Trailer } from './trailer.entity';

const SORTABLE = {
  unit: (unit: 'asc' | 'desc') => ({ unit }),
  bodyType: (bodyType: 'asc' | 'desc') => ({ bodyType }),
  lengthMetres: (lengthMetres: 'asc' | 'desc') => ({ lengthMetres }),
  year: (year: 'asc' | 'desc') => ({ year }),
  fleet: (fleet: 'asc' | 'desc') => ({ fleet }),
};

/** The trailers of the yard. */
@Injectable()
export class TrailersService {
  constructor(private readonly em: EntityManager) {}

  async list(query: TrailerListQueryDto): Promise<Page<TrailerDto>> {
    const pattern = query.search && containing(query.search);
    const found = await this.em.findAndCount(
      Trailer,
      {
        ...(query.bodyType && { bodyType: query.bodyType }),
        ...(pattern && {
          $or: [
            { unit: { $like: pattern } },
            { fleet: { $like: pattern } },
            { plate: { $like: pattern } },
          ],
        }),
      },
      { ...pageRequest(query, SORTABLE, 'unit'), populate: ['plan'] },
    );
    const open = await this.openTraces(found[0].map(({ id }) => id));
    return toPage(found, query, (trailer) => toTrailerDto(trailer, open.get(trailer.id) ?? null));
  }

  async read(id: string): Promise<TrailerDto> {
    const trailer = await this.em.findOneOrFail(Trailer, id, { populate: ['plan'] });
    const open = await this.openTraces([id]);
    return toTrailerDto(trailer, open.get(id) ?? null);
  }

  async create({ planId, ...values }: WriteTrailerDto): Promise<TrailerDto> {
    const unit = values.unit.trim();
    await this.assertUnitFree(unit);
    const trailer = this.em.create(Trailer, {
      ...values,
      id: uuidv7(),
      unit,
      plate: values.plate ?? null,
      notes: values.notes ?? '',
      plan: await this.findPlan(planId ?? null),
    });
    await this.em.flush();
    return toTrailerDto(trailer, null);
  }

  /** Changes what is given. @throws ProblemException `conflict` when `version` is not the newest. */
  async update(id: string, { planId, version, ...values }: UpdateTrailerDto): Promise<TrailerDto> {
    const trailer = await this.em.findOneOrFail(Trailer, id, { populate: ['plan'] });
    if (version !== undefined && version !== trailer.version) throw stale();
    const unit = values.unit?.trim() ?? trailer.unit;
    if (unit !== trailer.unit) await this.assertUnitFree(unit);
    const plan = planId === undefined ? trailer.plan : await this.findPlan(planId);
    this.em.assign(trailer, { ...given(values), unit, plan });
    try {
      await this.em.flush();
    } catch (error) {
      throw error instanceof OptimisticLockError ? stale() : error;
    }
    return this.read(id);
  }

  /** The newest open trace of each trailer that has one, by trailer id. */
  private async openTraces(trailerIds: string[]): Promise<Map<string, string>> {
    const traces = await this.em.find(
      Trace,
      { trailer: { $in: trailerIds }, step: { $nin: ['signed', 'abandoned'] } },
      { fields: ['id', 'trailer'], orderBy: { openedAt: 'asc', id: 'asc' } },
    );
    return new Map(traces.map(({ id, trailer }) => [trailer.id, id]));
  }

  private async assertUnitFree(unit: string): Promise<void> {
    if (await this.em.findOne(Trailer, { unit })) {
      throw ProblemException.field('conflict', 'unit', 'unitTaken', FIELD_MESSAGES.unitTaken);
    }
  }

  private async findPlan(id: string | null): Promise<Plan | null> {
    if (id === null) return null;
    const plan = await this.em.findOne(Plan, id);
    if (plan) return plan;
    throw ProblemException.field('validation', 'planId', 'unknownPlan', FIELD_MESSAGES.unknownPlan);
  }
}

function stale(): ProblemException {
  return ProblemException.field('conflict', 'version', 'staleVersion', FIELD_MESSAGES.staleVersion);
}

/** Without the keys whose value is undefined. */
function given<T extends object>(values: T): Partial<T> {
  return Object.fromEntries(
    Object.entries(values).filter(([, value]) => value !== undefined),
  ) as Partial<T>;
}
