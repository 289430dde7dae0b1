/** Whether something that was kept, perhaps by an older version, has the shape that is expected now. */
export type Guard<Value> = (value: unknown) => value is Value;

export const isText: Guard<string> = (value) => typeof value === 'string';
export const isNumber: Guard<number> = (value) => typeof value === 'number';
export const isFlag: Guard<boolean> = (value) => typeof value === 'boolean';

export const orNull =
  <Value>(guard: Guard<Value>): Guard<Value | null> =>
  (value): value is Value | null =>
    value === null || guard(value);

export const oneOf =
  <const Value>(...choices: readonly Value[]): Guard<Value> =>
  (value): value is Value =>
    choices.some((choice) => choice === value);

export const listOf =
  <Value>(guard: Guard<Value>): Guard<Value[]> =>
  (value): value is Value[] =>
    Array.isArray(value) && value.every(guard);

/** An object with these fields; others it may have are left alone. */
export const shapeOf =
  <Shape extends object>(fields: { [Field in keyof Shape]: Guard<Shape[Field]> }): Guard<Shape> =>
  (value): value is Shape =>
    typeof value === 'object' &&
    value !== null &&
    Object.entries<Guard<unknown>>(fields).every(([field, guard]) =>
      guard((value as Record<string, unknown>)[field]),
    );

/** The reader of a draft: what was kept where it fits, else `null`. */
export const readAs =
  <Value>(guard: Guard<Value>) =>
  (kept: unknown): Value | null =>
    guard(kept) ? kept : null;
