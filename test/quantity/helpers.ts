import type { DimensionName } from '../../extension/core/quantity/dimension.ts';
import { type Quantity, type QuantityProblem, readQuantity } from '../../extension/core/quantity/quantity.ts';

export function quantityOf(text: string, dimension: DimensionName): Quantity {
  const result = readQuantity(text, dimension);
  if ('problem' in result) throw new Error(`${text}: ${result.problem.message}`);
  return result.quantity;
}

export function problemOf(text: string, dimension: DimensionName): QuantityProblem {
  const result = readQuantity(text, dimension);
  if ('quantity' in result) throw new Error(`${text} was read as ${result.quantity.value}`);
  return result.problem;
}

/** The text after each of a problem's fixes. */
export function mended(text: string, problem: QuantityProblem): string[] {
  return problem.fixes.map((fix) => text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end));
}
