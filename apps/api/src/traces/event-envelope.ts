import type { TraceEvent } from '@lampwright/trace';
import { z } from 'zod';
import { FIELD_MESSAGES } from '../common/messages';
import { ProblemException } from '../common/problem.exception';

/** What every event must carry to be stored at all; the rest of it is the machine's to judge. */
const envelope = z.looseObject({
  id: z.uuid(),
  device: z.string().min(1).max(64),
  seq: z.int().min(1),
  at: z.iso.datetime({ offset: true }),
  by: z.string(),
  type: z.string().min(1).max(40),
});

/**
 * Checks that every event can be told from others and carries the id of the person who sends it.
 *
 * @throws ProblemException `validation`, or `notAllowed` for an event of somebody else; nothing is stored then.
 */
export function assertEnvelopes(events: readonly TraceEvent[], personId: string): void {
  const result = z.array(envelope).safeParse(events);
  if (!result.success) {
    throw new ProblemException('validation', {
      errors: result.error.issues.map(({ path: [index, ...keys], code, message }) => ({
        path: [`events[${String(index)}]`, ...keys.map(String)].join('.'),
        code,
        message,
      })),
    });
  }
  const foreign = events.findIndex(({ by }) => by !== personId);
  if (foreign < 0) return;
  const path = `events[${foreign}].by`;
  throw ProblemException.field('notAllowed', path, 'notThePerson', FIELD_MESSAGES.notThePerson);
}
