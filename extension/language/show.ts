import type { DimensionName } from '../core/quantity/dimension.ts';
import { formatPercent, formatQuantity } from '../core/quantity/format.ts';

/** How a predicted figure is shown: a dimension, a fraction in percent, or a plain factor. */
export type Kind = DimensionName | 'percent';

/** An SI value as text; absent stays absent. Exponents in units are raised, as print has them. */
export function show(value: number | undefined, kind: Kind, digits = 3): string | undefined {
  if (value === undefined) return undefined;
  const text = kind === 'percent' ? formatPercent(value, digits) : formatQuantity(value, kind, digits);
  return raised(text);
}

/** `J/cm2` as `J/cm²`, `cm-3` as `cm⁻³`; numbers stay as they are. */
export function raised(text: string): string {
  return text.replace(/(?<=[a-zA-Z])(-?)([23])(?![\d.])/g, (_, sign: string, digit: string) => {
    return `${sign === '' ? '' : '⁻'}${digit === '2' ? '²' : '³'}`;
  });
}
