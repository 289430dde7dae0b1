import { connectorByName } from '@lampwright/harness';
import { J560 } from './circuits';

describe('the circuits of the demo plans', () => {
  it('have the contacts and colours that the reference gives for SAE J560', () => {
    const contacts = connectorByName('SAE J560')?.contacts ?? [];
    const colours = new Map(contacts.map(({ pin, colour }) => [pin, colour]));
    const circuits = Object.values(J560);
    expect(circuits.map(({ pin }) => pin)).toEqual([2, 3, 4, 5, 6, 7]);
    for (const { id, pin, colour } of circuits) expect(colours.get(pin ?? 0), id).toBe(colour);
  });
});
