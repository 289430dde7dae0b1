import type { Circuit } from '@lampwright/harness';

/** The circuits of an SAE J560 connector that feed something; white, pin 1, is the ground return. */
export type Wire = 'markers' | 'left' | 'stop' | 'right' | 'tail' | 'abs';

/**
 * Contacts, colours and circuits of SAE J560, primary connector.
 * Source: colours and circuits from a public trailer wiring specification page; contact numbers from the
 * published table of trailer connectors in Australia, which rests on J560.
 */
export const J560: Record<Wire, Circuit> = {
  markers: { id: 'markers', name: 'Clearance and side markers', pin: 2, colour: 'black' },
  left: { id: 'left', name: 'Left turn', pin: 3, colour: 'yellow' },
  stop: { id: 'stop', name: 'Stop', pin: 4, colour: 'red' },
  right: { id: 'right', name: 'Right turn', pin: 5, colour: 'green' },
  tail: { id: 'tail', name: 'Tail, marker and identification', pin: 6, colour: 'brown' },
  abs: { id: 'abs', name: 'ABS power', pin: 7, colour: 'blue' },
};

export const WIRES: readonly Wire[] = ['markers', 'left', 'stop', 'right', 'tail', 'abs'];
