import { z } from 'zod';
import type { TraceEvent } from '../events';
import { amps, feed, id, listOf, name, partsUsed, place, text, time } from './values';

const envelope = {
  id,
  device: id,
  seq: z.int().min(1),
  at: time,
  by: id,
};

const seen = z.enum(['overload', 'holds', 'flickers']);
const method = z.enum(['look', 'swap', 'meter']);
const note = text.optional();
const read = { circuit: id, outcome: seen, amps: amps.optional() };

/** One type of event: its envelope and exactly the keys of its own. */
function event<Type extends string, Shape extends z.ZodRawShape>(type: Type, shape: Shape) {
  return z.strictObject({ ...envelope, type: z.literal(type), ...shape });
}

export const eventSchema: z.ZodType<TraceEvent> = z.discriminatedUnion('type', [
  event('intake.stated', { complaint: text, circuits: listOf(id), feed }),
  event('caution.ticked', {
    caution: z.enum([
      'shopProcedure',
      'chocks',
      'powerOffFirst',
      'secondSource',
      'jewellery',
      'noBypass',
      'noHolding',
      'hotParts',
      'placard',
      'highVoltage',
      'abs',
    ]),
  }),
  event('safety.confirmed', {}),
  event('circuit.confirmed', {
    circuit: id,
    outcome: z.enum(['overload', 'holds', 'flickers', 'dark']),
    amps: amps.optional(),
  }),
  event('confirm.finished', {}),
  event('wiggle.read', { circuit: id, outcome: seen }),
  event('nothing.found', {}),
  event('circuit.chosen', { circuit: id }),
  event('point.barred', { point: id, reason: z.enum(['cantReach', 'hardWired', 'missing']) }),
  event('point.allowed', { point: id }),
  event('damage.seen', { place, note }),
  event('powerUp.chosen', { open: listOf(id) }),
  event('reading.taken', { ...read, open: listOf(id), advised: listOf(id).optional() }),
  event('contradiction.explained', {
    meaning: z.enum(['repairedByHandling', 'comesAndGoes', 'planIsWrong', 'secondShort']),
  }),
  event('feed.changed', { feed }),
  event('coolDown.taken', {}),
  event('inspection.started', {}),
  event('place.inspected', { place, method, finding: z.enum(['clear', 'found']), note }),
  event('narrowing.resumed', {}),
  event('repair.made', { place, cause: text, correction: text, parts: partsUsed, note }),
  event('proof.read', read),
  event('point.reconnected', { point: id }),
  event('circuit.powered', read),
  event('lamp.checked', {
    circuit: id,
    lamp: id,
    result: z.enum(['lit', 'dark', 'dim', 'wrongCircuit']),
    note,
  }),
  event('circuit.allLit', { circuit: id }),
  event('lampCheck.finished', {}),
  event('trace.signed', {
    name,
    cause: text,
    correction: text,
    minutes: z.number().min(0).max(100_000),
    parts: partsUsed,
  }),
  event('event.undone', { target: id }),
  event('trace.abandoned', { reason: text }),
]);
