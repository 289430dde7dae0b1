import { Person } from '../people/person.entity';
import { Plan } from '../plans/plan.entity';
import { PlanRevision } from '../plans/plan-revision.entity';
import { Session } from '../auth/session.entity';
import { Trace, TraceCircuit } from '../traces/trace.entity';
import { StoredEvent } from '../traces/stored-event.entity';
import { Trailer } from '../trailers/trailer.entity';

/** Every table; listed, so that nothing depends on file names at run time. */
export const ENTITIES = [
  Person,
  Session,
  Plan,
  PlanRevision,
  Trailer,
  Trace,
  TraceCircuit,
  StoredEvent,
];
