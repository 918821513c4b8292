import type { Analysis } from '../analyse.ts';
import type { ReadDesign } from '../design/read.ts';
import { resolveDesign } from '../design/resolve.ts';
import { steps } from '../design/steps.ts';
import { wantedFigures } from '../design/wanted.ts';
import { type Outcome, predict } from '../physics/predict.ts';

/** A quantity of a design (by its path, whether or not the file writes it) at another value, SI. */
export interface Change {
  readonly path: string;
  readonly value: number;
}

/**
 * What a design would do with other values, defaults and table figures following as they would in the file. Without
 * the optimum coupling, which costs more than all the rest. Undefined where the design has no prediction to start from
 * or the changed one is none.
 */
export function vary(analysis: Analysis, changes: readonly Change[]): Outcome | undefined {
  if (analysis.outcome === undefined) return undefined;
  const values = changes.reduce((all: object, { path, value }) => withValue(all, steps(path), value), {
    ...analysis.design.values,
  });
  // The values keep the schema's shape: only quantities are replaced, by quantities.
  const design: ReadDesign = { ...analysis.design, values: values as ReadDesign['values'] };
  const { module } = resolveDesign(design);
  return module && predict(module, wantedFigures(design), { coupling: false });
}

function withValue(inner: unknown, [step, ...rest]: readonly (string | number)[], value: number): object {
  const next = (old: unknown): unknown => {
    if (rest.length > 0) return withValue(old, rest, value);
    return typeof old === 'number' ? value : { value, written: value, unit: '' };
  };
  if (typeof step === 'number') {
    const items: readonly unknown[] = Array.isArray(inner) ? inner : [];
    return items.map((item, index) => (index === step ? next(item) : item));
  }
  const section: Readonly<Record<string, unknown>> = isSection(inner) ? inner : {};
  return step === undefined ? section : { ...section, [step]: next(section[step]) };
}

function isSection(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
