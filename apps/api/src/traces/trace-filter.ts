import type { FilterQuery } from '@mikro-orm/core';
import { may } from '@lampwright/contracts';
import { containing } from '../common/paging';
import type { Person } from '../people/person.entity';
import type { TraceListQueryDto } from './dto/trace-list-query.dto';
import { CLOSED_STEPS } from './dto/trace-values';
import type { Trace } from './trace.entity';

/** The traces that a person may see: all of the yard, or only the own ones. */
export function visibleTo(person: Person): FilterQuery<Trace> {
  return may(person.role, 'traces.readAll') ? {} : { author: person.id };
}

/** The traces that a list asks for. */
export function traceFilter(query: TraceListQueryDto, person: Person): FilterQuery<Trace> {
  const conditions: FilterQuery<Trace>[] = [visibleTo(person)];
  if (query.step) conditions.push({ step: query.step });
  if (query.state === 'open') conditions.push({ step: { $nin: CLOSED_STEPS } });
  else if (query.state) conditions.push({ step: query.state });
  if (query.trailerId) conditions.push({ trailer: query.trailerId });
  if (query.authorId) conditions.push({ author: query.authorId });
  if (query.circuit) conditions.push({ circuits: { $some: { circuit: query.circuit } } });
  if (query.search) {
    const like = { $like: containing(query.search) };
    conditions.push({
      $or: [
        { trailer: { unit: like } },
        { author: { name: like } },
        { complaint: like },
        { foundLabel: like },
      ],
    });
  }
  return { $and: conditions };
}
