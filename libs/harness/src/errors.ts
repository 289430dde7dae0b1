import type { CircuitId, PartId } from './harness';

/** The plan has no circuit of this id. */
export class UnknownCircuitError extends Error {
  override readonly name = 'UnknownCircuitError';

  constructor(readonly circuit: CircuitId) {
    super(`The plan has no circuit "${circuit}".`);
  }
}

/** The part is not wired on the circuit asked about. */
export class PartNotOnCircuitError extends Error {
  override readonly name = 'PartNotOnCircuitError';

  constructor(
    readonly part: PartId,
    readonly circuit: CircuitId,
  ) {
    super(`Part "${part}" is not on circuit "${circuit}".`);
  }
}
