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
  openTraceId: string | null;
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
