import type { SchemaNode } from '../core/design/schema.ts';
import type { TreeNode } from '../core/design/tree.ts';
import { DIMENSIONS } from '../core/quantity/dimension.ts';
import { type Quantity, readQuantity } from '../core/quantity/quantity.ts';
import { raised } from './show.ts';

/** A written quantity in SI, `0.06 m`, its tolerance with it; undefined where that would only repeat what is written. */
export function siMeaning({ text }: TreeNode, schema: SchemaNode): string | undefined {
  if (schema.kind !== 'quantity' || text === undefined) return undefined;
  const read = readQuantity(text, schema.dimension);
  if ('problem' in read) return undefined;
  const { quantity } = read;
  const { siUnit } = DIMENSIONS[schema.dimension];
  const tolerance = quantity.tolerance === undefined ? '' : ` ± ${short(quantity.tolerance)}`;
  if (isPlain(quantity, siUnit)) return undefined;
  return raised(`${short(quantity.value)}${tolerance}${siUnit === '' ? '' : ` ${siUnit}`}`);
}

function isPlain({ unit, tolerance }: Quantity, siUnit: string): boolean {
  return unit === siUnit && tolerance === undefined;
}

/** All digits that were written, without those that binary fractions add. */
function short(value: number): string {
  const text = String(Number(value.toPrecision(12)));
  return text.replace('e+', 'e');
}
