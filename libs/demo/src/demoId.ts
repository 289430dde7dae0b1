/** A fixed UUID of the demo yard: made up, of the shape of version 7. `kind` and `number` keep them apart. */
export function demoId(kind: 'person' | 'plan' | 'trailer' | 'trace', number: number): string {
  const block = { person: 'a001', plan: 'a002', trailer: 'a003', trace: 'a004' }[kind];
  return `01941f00-${block}-7000-8000-${String(number).padStart(12, '0')}`;
}
