import { EntityManager } from '@mikro-orm/better-sqlite';
import { Injectable } from '@nestjs/common';
import { may, type Page } from '@lampwright/contracts';
import { pageRequest, toPage } from '../common/paging';
import type { Person } from '../people/person.entity';
import { toTraceSummaryDto, type TraceDto, type TraceSummaryDto } from './dto/trace.dto';
import type { TraceListQueryDto } from './dto/trace-list-query.dto';
import { CLOSED_STEPS } from './dto/trace-values';
import { loadRecord } from './load-record';
import { traceFilter, visibleTo } from './trace-filter';
import { Trace } from './trace.entity';

const SORTABLE = {
  openedAt: (openedAt: 'asc' | 'desc') => ({ openedAt }),
  signedAt: (signedAt: 'asc' | 'desc') => ({ signedAt }),
  step: (step: 'asc' | 'desc') => ({ step }),
  powerUps: (powerUps: 'asc' | 'desc') => ({ powerUps }),
  complaint: (complaint: 'asc' | 'desc') => ({ complaint }),
  found: (foundLabel: 'asc' | 'desc') => ({ foundLabel }),
  trailer: (unit: 'asc' | 'desc') => ({ trailer: { unit } }),
  author: (name: 'asc' | 'desc') => ({ author: { name } }),
};

/** Reading traces. */
@Injectable()
export class TracesService {
  constructor(private readonly em: EntityManager) {}

  async list(query: TraceListQueryDto, person: Person): Promise<Page<TraceSummaryDto>> {
    const found = await this.em.findAndCount(Trace, traceFilter(query, person), {
      ...pageRequest(query, SORTABLE, '-openedAt'),
      populate: ['author', 'circuits'],
      populateWhere: {},
    });
    return toPage(found, query, toTraceSummaryDto);
  }

  /** A trace that the person may not see is not found. */
  async read(id: string, person: Person): Promise<TraceDto> {
    const trace = await this.em.findOneOrFail(
      Trace,
      { $and: [{ id }, visibleTo(person)] },
      { populate: ['author', 'circuits'] },
    );
    return {
      ...toTraceSummaryDto(trace),
      record: await loadRecord(this.em, trace),
      writable: may(person.role, 'traces.run') && !CLOSED_STEPS.includes(trace.step),
    };
  }
}
