import { readHarness, type Harness, type HarnessFault } from '@lampwright/harness';
import type { FieldProblem } from '@lampwright/contracts';
import { ProblemException } from '../common/problem.exception';
import { faultMessage } from './fault-messages';

const MORE_FAULTS = 'The plan was not stored. It has more faults than errors lists.';

/** Reads a plan document, or refuses it with every fault by its path. */
export function requireHarness(document: unknown): Harness {
  const result = readHarness(document);
  if (result.ok) return result.harness;
  throw new ProblemException('planFaults', {
    errors: result.faults.map(toFieldProblem),
    ...(result.more && { detail: MORE_FAULTS }),
  });
}

function toFieldProblem(fault: HarnessFault): FieldProblem {
  const { code, path, ...facts } = fault;
  return { path, code, message: faultMessage(fault), params: facts };
}
