import type { Harness } from '@lampwright/harness';

export interface PlanSummaryDto {
  id: string;
  name: string;
  revision: number;
  parts: number;
  circuits: number;
  updatedAt: string;
}

export interface PlanDto extends PlanSummaryDto {
  harness: Harness;
}

/** The body of `POST /api/plans` and `POST /api/plans/:id/revisions`: read by `readHarness`, refused with all its faults. */
export interface WritePlanRequest {
  harness: unknown;
}
