import { z } from 'zod';
import type { LampColour, LampTechnology, PartKind, ProtectionKind } from '../harness';

// Zod would try to compile its schemas with `new Function`, which a strict content security policy reports.
z.config({ jitless: true });

export const PART_KINDS: readonly PartKind[] = ['inlet', 'plug', 'splice', 'lamp', 'module'];
const PROTECTION_KINDS: readonly ProtectionKind[] = [
  'auto-reset',
  'manual-reset',
  'fuse',
  'electronic',
];
const LAMP_TECHNOLOGIES: readonly LampTechnology[] = ['led', 'filament'];
const LAMP_COLOURS: readonly LampColour[] = ['amber', 'red', 'white'];

const text = z.string().trim().min(1);
const amount = z.number().min(0);
/** Lists are read element by element, so that a huge list of rubbish can be left at the fault limit. */
const list = z.array(z.unknown());

export const documentShape = z.object({
  name: text,
  supply: z.object({ volts: z.literal([12, 24]), connector: text }),
  circuits: list.min(1),
  parts: list,
  runs: list,
});

export const circuitShape = z.object({
  id: text,
  name: text,
  pin: z.int().min(1).optional(),
  colour: z.string().optional(),
  protection: z.object({ amps: amount, kind: z.enum(PROTECTION_KINDS) }).optional(),
});

export const partShape = z.object({
  id: text,
  kind: z.enum(PART_KINDS),
  label: text,
  at: z.object({ along: z.number(), across: z.number(), up: amount.optional() }),
  where: z.string().optional(),
  separable: z.object({ openSeconds: amount, closeSeconds: amount }).optional(),
  faultWeight: amount.optional(),
  lamp: z
    .object({
      loads: list,
      technology: z.enum(LAMP_TECHNOLOGIES),
      colour: z.enum(LAMP_COLOURS).optional(),
      functions: list.optional(),
    })
    .optional(),
  module: z.object({ loads: list }).optional(),
});

export const runShape = z.object({
  id: text,
  from: text,
  to: text,
  circuits: list.min(1),
  metres: amount,
  conductor: z.object({ awg: amount.optional(), mm2: z.number().positive().optional() }).optional(),
  faultWeight: amount.optional(),
});

export const loadShape = z.object({ circuit: text, amps: amount });
export const nameShape = text;
