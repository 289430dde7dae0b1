import type { TrailerDto, WriteTrailerRequest } from '@lampwright/contracts';
import type { BodyType, SecondSource } from '@lampwright/trace';
import { lengthFromField, lengthToField, type LengthUnit } from '../../lib/format';

/** The form as it is typed; measures are in the person's unit. */
export interface TrailerValues {
  unit: string;
  bodyType: BodyType;
  lengthMetres: string;
  widthMetres: string;
  year: string;
  plate: string;
  fleet: string;
  notes: string;
  secondSources: SecondSource[];
  abs: boolean;
  planId: string;
}

export const BLANK: TrailerValues = {
  unit: '',
  bodyType: 'dryVan',
  lengthMetres: '',
  widthMetres: '',
  year: '',
  plate: '',
  fleet: '',
  notes: '',
  secondSources: [],
  abs: true,
  planId: '',
};

export function toValues(trailer: TrailerDto, unit: LengthUnit): TrailerValues {
  return {
    unit: trailer.unit,
    bodyType: trailer.bodyType,
    lengthMetres: lengthToField(trailer.lengthMetres, unit),
    widthMetres: lengthToField(trailer.widthMetres, unit),
    year: String(trailer.year),
    plate: trailer.plate ?? '',
    fleet: trailer.fleet,
    notes: trailer.notes,
    secondSources: trailer.secondSources,
    abs: trailer.abs,
    planId: trailer.plan?.id ?? '',
  };
}

/** What is sent. A measure that was not touched goes back as it came, not as it was rounded for the field. */
export function toRequest(
  values: TrailerValues,
  unit: LengthUnit,
  before?: TrailerDto,
): WriteTrailerRequest {
  const measure = (text: string, old: number | undefined) =>
    old !== undefined && lengthToField(old, unit) === text ? old : lengthFromField(text, unit);
  return {
    unit: values.unit.trim(),
    bodyType: values.bodyType,
    lengthMetres: measure(values.lengthMetres, before?.lengthMetres),
    widthMetres: measure(values.widthMetres, before?.widthMetres),
    year: Number(values.year),
    plate: values.plate.trim() || null,
    fleet: values.fleet.trim(),
    notes: values.notes.trim(),
    secondSources: values.secondSources,
    abs: values.abs,
    planId: values.planId || null,
  };
}
