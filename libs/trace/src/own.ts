/** The value an object itself holds under a key; ids come from people, so `constructor` must not be found by heritage. */
export function own<Value>(
  record: Readonly<Record<string, Value>>,
  key: string,
): Value | undefined {
  return Object.hasOwn(record, key) ? record[key] : undefined;
}
