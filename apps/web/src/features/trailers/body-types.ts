import type { BodyType, SecondSource } from '@lampwright/trace';

export const BODY_TYPES = [
  'dryVan',
  'refrigerated',
  'flatbed',
  'pup',
  'containerChassis',
  'carHauler',
  'utility',
  'tank',
] as const satisfies BodyType[];

export const SECOND_SOURCES = [
  'battery',
  'liftGate',
  'refrigeration',
  'solar',
] as const satisfies SecondSource[];
