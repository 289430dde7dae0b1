import type { BodyType, SecondSource } from '@lampwright/trace';
import type { PageQuery } from './paging';

export interface TrailerDto {
  id: string;
  unit: string;
  bodyType: BodyType;
  lengthMetres: number;
  widthMetres: number;
  year: number;
  plate: string | null;
  fleet: string;
  notes: string;
  secondSources: SecondSource[];
  abs: boolean;
  /** The plan it is wired by; `null` while there is none. */
  plan: { id: string; name: string; revision: number } | null;
  /** The newest trace on it that is neither signed nor abandoned. */
  openTraceId: string | null;
  /** Counts the changes; sent back with a change, it keeps two people from overwriting each other. */
  version?: number;
}

export interface TrailerListQuery extends PageQuery {
  bodyType?: BodyType;
}

export interface WriteTrailerRequest {
  unit: string;
  bodyType: BodyType;
  lengthMetres: number;
  widthMetres: number;
  year: number;
  plate?: string | null;
  fleet: string;
  notes?: string;
  secondSources: SecondSource[];
  abs: boolean;
  planId?: string | null;
}

/** Only what is given changes. With a `version` that is no longer the newest the answer is 409 `conflict`. */
export interface UpdateTrailerRequest extends Partial<WriteTrailerRequest> {
  version?: number;
}
