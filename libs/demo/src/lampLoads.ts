import type { Lamp, LampColour, LampTechnology } from '@lampwright/harness';
import { WIRES } from './circuits';
import type { Wire } from './circuits';
import { lampAmps } from './lampAmps';
import type { LampFunction } from './lampAmps';

export type Feeds = Partial<Record<LampFunction, Wire>>;

/** A housing's lamp data. Functions that share a circuit share one light source: the brighter one counts. */
export function lampLoads(technology: LampTechnology, colour: LampColour, feeds: Feeds): Lamp {
  const functions = Object.keys(feeds) as LampFunction[];
  const loads = WIRES.flatMap((circuit) => {
    const amps = functions
      .filter((each) => feeds[each] === circuit)
      .map((each) => lampAmps(technology, each));
    return amps.length === 0 ? [] : [{ circuit, amps: Math.max(...amps) }];
  });
  return { loads, technology, colour, functions };
}
