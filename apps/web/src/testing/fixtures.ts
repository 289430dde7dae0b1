import {
  PERMISSIONS,
  may,
  type AccountDto,
  type Page,
  type Permission,
  type PersonDto,
  type PlanDto,
  type Role,
  type TraceSummaryDto,
  type TrailerDto,
} from '@lampwright/contracts';
import { goodPlan } from '@lampwright/harness/testing';

export function person(changes: Partial<PersonDto> = {}): PersonDto {
  return {
    id: 'p1',
    name: 'Orla Venn',
    email: 'orla@yard.example',
    role: 'technician',
    closed: false,
    lastSignInAt: '2026-11-30T14:00:00.000Z',
    ...changes,
  };
}

export function account(role: Role = 'technician', changes: Partial<AccountDto> = {}): AccountDto {
  const all = Object.keys(PERMISSIONS) as Permission[];
  return {
    ...person({ role }),
    preferences: { lengths: 'feet', theme: 'light' },
    permissions: all.filter((permission) => may(role, permission)),
    ...changes,
  };
}

export function trailer(changes: Partial<TrailerDto> = {}): TrailerDto {
  return {
    id: 't1',
    unit: 'T-118',
    bodyType: 'dryVan',
    lengthMetres: 14.63,
    widthMetres: 2.59,
    year: 2019,
    plate: null,
    fleet: 'Quillmoor Freight',
    notes: '',
    secondSources: [],
    abs: true,
    plan: { id: 'pl1', name: 'Van, two-piece harness', revision: 2 },
    openTraceId: null,
    version: 3,
    ...changes,
  };
}

export function trace(changes: Partial<TraceSummaryDto> = {}): TraceSummaryDto {
  return {
    id: 'tr1',
    trailer: { id: 't1', unit: 'T-118', bodyType: 'dryVan' },
    author: { id: 'p1', name: 'Orla Venn' },
    step: 'narrow',
    complaint: 'Markers blow the fuse',
    circuits: ['black'],
    circuitNames: ['Clearance and markers'],
    powerUps: 2,
    openedAt: '2026-11-30T14:00:00.000Z',
    signedAt: null,
    found: null,
    ...changes,
  };
}

export function plan(changes: Partial<PlanDto> = {}): PlanDto {
  return {
    id: 'pl1',
    name: 'Van, two-piece harness',
    revision: 2,
    parts: goodPlan.parts.length,
    circuits: goodPlan.circuits.length,
    updatedAt: '2026-11-02T09:00:00.000Z',
    harness: goodPlan,
    ...changes,
  };
}

export function page<T>(...items: T[]): Page<T> {
  return { items, total: items.length, page: 1, size: 25 };
}
