import type { Analysis } from '../analyse.ts';
import { indexByPath, type TreeNode } from '../design/tree.ts';
import { readQuantity } from '../quantity/quantity.ts';
import type { Fix } from '../report/problem.ts';

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/;

/** The scalar at a path whose characters can be edited where it is used: neither merged in nor an alias. */
export function editableScalar({ design }: Analysis, path: string): TreeNode | undefined {
  const node = indexByPath(design.root).get(path);
  if (node?.kind !== 'scalar' || node.textStart === undefined || node.merged) return undefined;
  return node.value.start === node.written.start ? node : undefined;
}

/** A value (SI) as the text of a design would have it, in the unit that it is written in. */
export interface Rewriting {
  /** SI, of the rounded number. */
  readonly value: number;
  /** With its unit, e.g. `571 W`. */
  readonly shown: string;
  /** Replaces the number alone; unit, tolerance and comment stay. */
  readonly edit: Omit<Fix, 'title'>;
}

export type Rounding = 'up' | 'down' | 'nearest';

/**
 * Writes a value in the unit that the path has in the text, rounded to `digits` significant digits. Undefined where the text can't be edited there, or has no proportional unit.
 */
export function rewriting(
  analysis: Analysis,
  path: string,
  value: number,
  digits: number,
  round: Rounding,
): Rewriting | undefined {
  const node = editableScalar(analysis, path);
  const schema = analysis.design.schemaOf(path);
  if (node?.text === undefined || node.textStart === undefined || schema?.kind !== 'quantity') return undefined;
  const read = readQuantity(node.text, schema.dimension);
  const blanks = node.text.length - node.text.trimStart().length;
  const number = NUMBER.exec(node.text.trimStart())?.[0];
  if ('problem' in read || number === undefined || !(read.quantity.written > 0) || !(value > 0)) return undefined;
  const { quantity } = read;
  const text = plain(rounded((value / quantity.value) * quantity.written, digits, round));
  const shown = quantity.unit === '' ? text : `${text} ${quantity.unit}`;
  const again = readQuantity(shown, schema.dimension);
  if ('problem' in again) return undefined;
  const start = node.textStart + blanks;
  return { value: again.quantity.value, shown, edit: { range: { start, end: start + number.length }, text } };
}

/** What is within a millionth of a step counts as on it. */
function rounded(value: number, digits: number, round: Rounding): number {
  const step = 10 ** (Math.floor(Math.log10(value)) + 1 - digits);
  const steps = value / step;
  const whole = { up: Math.ceil(steps - 1e-6), down: Math.floor(steps + 1e-6), nearest: Math.round(steps) }[round];
  return Number((whole * step).toPrecision(digits + 2));
}

/** Without a power of ten where a person would write none. */
function plain(value: number): string {
  const magnitude = Math.abs(value);
  if (magnitude >= 1e6 || magnitude < 1e-4) return value.toExponential().replace('e+', 'e');
  return String(value);
}
