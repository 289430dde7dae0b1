import { HARNESS_FORMAT } from '@lampwright/harness';
import type { Harness, LampTechnology, Part, PartId } from '@lampwright/harness';
import { J560, WIRES } from './circuits';
import { separable } from './handling';
import type { Handling } from './handling';
import { lampLoads } from './lampLoads';
import type { At, LampNode, ModuleNode, Node } from './nodes';
import { runsOf } from './runs';

export interface PlanBuilder {
  inlet(node: Pick<Node, 'id' | 'label' | 'at' | 'where'>): void;
  plug(node: Node & { handling: Handling }): void;
  splice(node: Node): void;
  lamp(node: LampNode): void;
  module(node: ModuleNode): void;
  build(): Harness;
}

/**
 * Starts a plan on a J560 connector at 12 V. Parts are given with the part that feeds them; the runs and the
 * circuits on each run are worked out from the loads at the ends, so that a lamp is fed by exactly what it loads.
 */
export function planBuilder(name: string, technology: LampTechnology): PlanBuilder {
  const parts: Part[] = [];
  const nodes = new Map<PartId, Node>();

  const add = (node: Node, part: Pick<Part, 'kind' | 'separable' | 'lamp' | 'module'>) => {
    nodes.set(node.id, node);
    parts.push({
      id: node.id,
      kind: part.kind,
      label: node.label,
      at: position(node.at),
      where: node.where,
      ...(part.separable && { separable: part.separable }),
      ...(node.faultWeight !== undefined && { faultWeight: node.faultWeight }),
      ...(part.lamp && { lamp: part.lamp }),
      ...(part.module && { module: part.module }),
    });
  };

  return {
    inlet: ({ at, ...inlet }) => parts.push({ kind: 'inlet', ...inlet, at: position(at) }),
    plug: (node) => add(node, { kind: 'plug', separable: separable(node.handling) }),
    splice: (node) => add(node, { kind: 'splice' }),
    lamp: (node) =>
      add(node, {
        kind: 'lamp',
        ...(node.handling && { separable: separable(node.handling) }),
        lamp: lampLoads(node.technology ?? technology, node.colour, node.feeds),
      }),
    module: (node) =>
      add(node, {
        kind: 'module',
        ...(node.handling && { separable: separable(node.handling) }),
        module: {
          loads: WIRES.flatMap((circuit) => {
            const amps = node.loads[circuit];
            return amps === undefined ? [] : [{ circuit, amps }];
          }),
        },
      }),
    build: () => {
      const runs = runsOf(parts, nodes);
      const used = new Set(runs.flatMap((run) => run.circuits));
      return {
        format: HARNESS_FORMAT,
        name,
        supply: { volts: 12, connector: 'SAE J560' },
        circuits: WIRES.filter((wire) => used.has(wire)).map((wire) => J560[wire]),
        parts,
        runs,
      };
    },
  };
}

function position([along, across, up]: At): Part['at'] {
  return { along, across, up };
}
