/**
 * How far a row can be relied on: `read` in the primary text or an official page; `secondary`, in a page that reports
 * it; `memory`, not found in public, to be checked against the standard before anyone rests on it.
 */
export type Standing = 'read' | 'secondary' | 'memory';

/** Every row of the reference data says where it is from. */
export interface Sourced {
  source: string;
  standing: Standing;
}
