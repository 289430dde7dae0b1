import type { BodyType, SecondSource } from '@lampwright/trace';

export const BODY_TYPES = [
  'dryVan',
  'flatbed',
  'pup',
  'containerChassis',
  'refrigerated',
  'carHauler',
  'tank',
  'utility',
] as const satisfies BodyType[];

export const SECOND_SOURCES = [
  'battery',
  'liftGate',
  'refrigeration',
  'solar',
] as const satisfies SecondSource[];
