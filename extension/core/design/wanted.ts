import type { Requirement } from '../physics/requirements.ts';
import type { Quantity } from '../quantity/quantity.ts';
import type { ReadDesign } from './read.ts';

/** The design's requirements as limits in SI, in the order of the file. */
export function wantedFigures(design: ReadDesign): Requirement[] {
  const wanted: Readonly<Record<string, { readonly min?: Quantity; readonly max?: Quantity } | undefined>> =
    design.values.requirements ?? {};
  return Object.entries(wanted).flatMap(([name, range]) =>
    range?.min || range?.max
      ? [{ name, ...(range.min && { minimum: range.min.value }), ...(range.max && { maximum: range.max.value }) }]
      : [],
  );
}
