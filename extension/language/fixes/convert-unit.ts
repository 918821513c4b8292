import { editableScalar } from '../../core/explore/rewrite.ts';
import { DIMENSIONS } from '../../core/quantity/dimension.ts';
import { type Quantity, readQuantity } from '../../core/quantity/quantity.ts';
import type { Fix } from '../../core/report/problem.ts';
import { raised } from '../show.ts';
import type { Subject } from '../subject.ts';

/** `NUMBER UNIT`, and a tolerance behind it. */
const PARTS =
  /^([+-]?[\d.]+(?:[eE][+-]?\d+)?)(\s*)([^±+]*?)(?:(\s*(?:±|\+\/-)\s*)([\d.]+(?:[eE][+-]?\d+)?)(\s*)(\S+)?)?$/;

/** The same quantity in the other units of its dimension, an absolute tolerance with it. */
export function conversions({ analysis }: Subject, path: string): Fix[] {
  const node = editableScalar(analysis, path);
  const schema = analysis.design.schemaOf(path);
  if (node?.text === undefined || node.textStart === undefined || schema?.kind !== 'quantity') return [];
  const read = readQuantity(node.text, schema.dimension);
  const parts = PARTS.exec(node.text);
  if ('problem' in read || parts === null) return [];
  const { quantity } = read;
  const range = { start: node.textStart, end: node.textStart + node.text.length };
  // A ratio is written bare or in percent; parts per million are for those who have begun with them.
  const units = schema.dimension === 'ratio' ? ['%', ''] : DIMENSIONS[schema.dimension].units;
  return units.flatMap((unit): Fix[] => {
    const text = inUnit(parts, quantity, unit, schema.dimension);
    return text === undefined ? [] : [{ title: `Write as ${raised(text)}`, range, text }];
  });
}

function inUnit(
  parts: RegExpExecArray,
  quantity: Quantity,
  unit: string,
  dimension: Parameters<typeof readQuantity>[1],
): string | undefined {
  const one = readQuantity(`1 ${unit}`, dimension);
  const same = readQuantity(`1 ${quantity.unit}`, dimension);
  // Degrees Celsius have no factor; the unit itself needs no conversion.
  if ('problem' in one || 'problem' in same || unit === 'Cel' || quantity.unit === 'Cel') return undefined;
  const factor = same.quantity.value / one.quantity.value;
  const converted = (number: string | undefined): string => plain(Number(number) * factor);
  if (factor === 1) return undefined;
  const [, number, gap = ' ', , sign, tolerance, tail = '', toleranceUnit] = parts;
  const text = unit === '' ? converted(number) : `${converted(number)}${gap || ' '}${unit}`;
  if (sign === undefined) return readsAs(text, quantity, dimension);
  const relative = toleranceUnit === '%' || toleranceUnit === 'ppm';
  const rest = relative
    ? `${tolerance}${tail}${toleranceUnit}`
    : `${converted(tolerance)}${toleranceUnit && unit ? ` ${unit}` : ''}`;
  return readsAs(`${text}${sign}${rest}`, quantity, dimension);
}

/** Only what means the same, and what a person would write: no powers of ten, no long rows of noughts. */
function readsAs(text: string, { value, tolerance = 0 }: Quantity, dimension: Parameters<typeof readQuantity>[1]) {
  const read = readQuantity(text, dimension);
  if ('problem' in read || !isHandy(Math.abs(read.quantity.written))) return undefined;
  const close = (one: number, other: number) => Math.abs(one - other) <= 1e-12 * Math.abs(other);
  return close(read.quantity.value, value) && close(read.quantity.tolerance ?? 0, tolerance) ? text : undefined;
}

function isHandy(number: number): boolean {
  return number >= 1e-3 && number < 1e5;
}

/** Twelve digits undo the rounding of a factor such as 1e-3. */
function plain(value: number): string {
  return String(Number(value.toPrecision(12)));
}
