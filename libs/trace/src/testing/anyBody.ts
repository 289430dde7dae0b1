import fc from 'fast-check';
import type { PartUsed, TraceEventBody } from '../events';

const circuit = fc.constantFrom('tail', 'stop', 'abs', 'constructor');
const point = fc.constantFrom('p1', 'p2', 'p3', 'l1', 'l2', 'l3', 'inlet', '__proto__');
const open = fc.array(point, { maxLength: 3 });
const seen = fc.constantFrom('overload' as const, 'holds' as const, 'flickers' as const);
const feed = fc.record({
  kind: fc.constantFrom(
    'seriesLamp' as const,
    'tester' as const,
    'breaker' as const,
    'ohmmeter' as const,
  ),
  atHand: fc.boolean(),
});
const place = fc.oneof(
  fc.record({
    kind: fc.constant('run' as const),
    id: fc.constantFrom('p2-p3', 'inlet-m1', 'none'),
  }),
  fc.record({ kind: fc.constant('part' as const), id: point }),
  fc.record({
    kind: fc.constant('part' as const),
    id: fc.constantFrom('p2', 'l1'),
    half: fc.constantFrom('feed' as const, 'load' as const),
  }),
);
const only = <Type extends string>(type: Type) => fc.record({ type: fc.constant(type) });

/** Something a person may send about the line harness at any moment, sensible or not. */
export const anyBody: fc.Arbitrary<TraceEventBody> = fc.oneof(
  fc.record({
    type: fc.constant('intake.stated' as const),
    complaint: fc.string(),
    circuits: fc.array(circuit, { maxLength: 2 }),
    feed,
  }),
  fc.record({
    type: fc.constant('caution.ticked' as const),
    caution: fc.constantFrom('chocks' as const, 'noHolding' as const, 'highVoltage' as const),
  }),
  only('safety.confirmed'),
  fc.record({
    type: fc.constant('circuit.confirmed' as const),
    circuit,
    outcome: fc.oneof(seen, fc.constant('dark' as const)),
  }),
  only('confirm.finished'),
  fc.record({ type: fc.constant('wiggle.read' as const), circuit, outcome: seen }),
  only('nothing.found'),
  fc.record({ type: fc.constant('circuit.chosen' as const), circuit }),
  fc.record({
    type: fc.constant('point.barred' as const),
    point,
    reason: fc.constantFrom('cantReach' as const, 'missing' as const),
  }),
  fc.record({ type: fc.constant('point.allowed' as const), point }),
  fc.record({ type: fc.constant('damage.seen' as const), place }),
  fc.record({ type: fc.constant('powerUp.chosen' as const), open }),
  fc.record({ type: fc.constant('reading.taken' as const), circuit, open, outcome: seen }),
  fc.record({
    type: fc.constant('contradiction.explained' as const),
    meaning: fc.constantFrom(
      'repairedByHandling' as const,
      'comesAndGoes' as const,
      'planIsWrong' as const,
      'secondShort' as const,
    ),
  }),
  fc.record({ type: fc.constant('feed.changed' as const), feed }),
  only('coolDown.taken'),
  only('inspection.started'),
  fc.record({
    type: fc.constant('place.inspected' as const),
    place,
    method: fc.constant('look' as const),
    finding: fc.constantFrom('clear' as const, 'found' as const),
  }),
  only('narrowing.resumed'),
  fc.record({
    type: fc.constant('repair.made' as const),
    place,
    cause: fc.string(),
    correction: fc.string(),
    parts: fc.constant<PartUsed[]>([]),
  }),
  fc.record({ type: fc.constant('proof.read' as const), circuit, outcome: seen }),
  fc.record({ type: fc.constant('point.reconnected' as const), point }),
  fc.record({ type: fc.constant('circuit.powered' as const), circuit, outcome: seen }),
  fc.record({
    type: fc.constant('lamp.checked' as const),
    circuit,
    lamp: point,
    result: fc.constantFrom('lit' as const, 'dim' as const),
  }),
  fc.record({ type: fc.constant('circuit.allLit' as const), circuit }),
  only('lampCheck.finished'),
  fc.record({
    type: fc.constant('trace.signed' as const),
    name: fc.string(),
    cause: fc.string(),
    correction: fc.string(),
    minutes: fc.integer(),
    parts: fc.constant<PartUsed[]>([]),
  }),
);
