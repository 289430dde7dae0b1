import type { Page } from '@lampwright/contracts';
import { FIELD_MESSAGES } from './messages';
import type { PageQueryDto } from './page-query.dto';
import { ProblemException } from './problem.exception';

/** Where a page of a list begins, how long it is, and in which order. */
export interface PageRequest {
  limit: number;
  offset: number;
  orderBy: Record<string, unknown>[];
}

/**
 * Turns a page query into what the database needs. `sortable` maps the public field names to the order they stand
 * for; the id comes last so that pages never overlap.
 */
export function pageRequest(
  query: PageQueryDto,
  sortable: Record<string, (direction: 'asc' | 'desc') => Record<string, unknown>>,
  fallback: string,
): PageRequest {
  const sort = query.sort ?? fallback;
  const direction = sort.startsWith('-') ? 'desc' : 'asc';
  const order = Object.hasOwn(sortable, sort.replace(/^-/, ''))
    ? sortable[sort.replace(/^-/, '')]
    : undefined;
  if (!order) {
    throw ProblemException.field('validation', 'sort', 'unknownSort', FIELD_MESSAGES.unknownSort, {
      allowed: Object.keys(sortable),
    });
  }
  return {
    limit: query.size,
    offset: (query.page - 1) * query.size,
    orderBy: [order(direction), { id: direction }],
  };
}

/** A page with its items turned into what the API sends. */
export function toPage<Row, Item>(
  [rows, total]: [Row[], number],
  query: PageQueryDto,
  toItem: (row: Row) => Item,
): Page<Item> {
  return { items: rows.map(toItem), total, page: query.page, size: query.size };
}

/** A pattern for `like` that finds `text` anywhere; the database's own wildcards in it are taken out. */
export function containing(text: string): string {
  return `%${text.trim().replace(/[%_\\]/g, ' ')}%`;
}
