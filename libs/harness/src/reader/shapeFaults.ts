import type { z } from 'zod';
import type { HarnessFault } from '../faults';
import type { FaultList } from './faultList';

/** Where a value stands in the document, and the id of the thing it belongs to. */
export interface Spot {
  path: string;
  id?: string | undefined;
}

type Issue = z.core.$ZodIssue;

/** Checks one value and adds a fault for each way in which it has the wrong shape. */
export function checkShape(shape: z.ZodType, value: unknown, spot: Spot, faults: FaultList): void {
  for (const issue of shape.safeParse(value).error?.issues ?? []) {
    faults.add({
      ...factsOf(issue, valueAt(value, issue.path)),
      path: joinPath(spot.path, issue.path),
      ...(spot.id !== undefined && { id: spot.id }),
    });
  }
}

/** Checks the elements of a list, and stops when there are more faults than anyone wants. */
export function checkEach(
  shape: z.ZodType,
  values: readonly unknown[],
  spot: Spot,
  faults: FaultList,
): void {
  for (const [index, value] of values.entries()) {
    if (faults.full) return;
    checkShape(shape, value, { ...spot, path: `${spot.path}[${index}]` }, faults);
  }
}

/** The name of a JSON value's type. */
export function typeName(value: unknown): string {
  if (value === null) return 'null';
  return Array.isArray(value) ? 'array' : typeof value;
}

function factsOf(
  issue: Issue,
  value: unknown,
): Pick<HarnessFault, 'code' | 'found' | 'wanted' | 'others'> {
  switch (issue.code) {
    case 'invalid_type':
      return ofType(issue.expected, value);
    case 'invalid_value':
      return ofChoice(issue.values.map(String), value);
    case 'too_small':
      if (issue.origin !== 'number') return { code: 'empty' };
      return {
        code: issue.inclusive && issue.minimum === 0 ? 'negative' : 'notPositive',
        ...found(value),
      };
    default:
      return { code: 'notAllowed', ...found(value) };
  }
}

function ofType(expected: string, value: unknown): Pick<HarnessFault, 'code' | 'found' | 'wanted'> {
  const wanted = expected === 'int' ? 'number' : expected;
  if (value === undefined) return { code: 'missing', wanted };
  if (typeof value !== 'number' || wanted !== 'number') {
    return { code: 'wrongType', found: typeName(value), wanted };
  }
  // NaN and the infinities as words: JSON cannot carry them as numbers.
  return Number.isFinite(value)
    ? { code: 'notWhole', found: value }
    : { code: 'notFinite', found: String(value) };
}

function ofChoice(
  others: string[],
  value: unknown,
): Pick<HarnessFault, 'code' | 'found' | 'wanted' | 'others'> {
  if (value === undefined) return { code: 'missing', others };
  return { code: 'notAllowed', ...found(value), others };
}

/** Numbers and texts are shown as they are; of anything else only its type. */
function found(value: unknown): { found: string | number } {
  if (typeof value === 'string' || Number.isFinite(value))
    return { found: value as string | number };
  return { found: typeof value === 'number' ? String(value) : typeName(value) };
}

function valueAt(value: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>((inner, key) => (inner as Record<PropertyKey, unknown>)[key], value);
}

function joinPath(base: string, path: readonly PropertyKey[]): string {
  return path.reduce<string>((joined, key) => {
    if (typeof key === 'number') return `${joined}[${key}]`;
    return joined === '' ? String(key) : `${joined}.${String(key)}`;
  }, base);
}
