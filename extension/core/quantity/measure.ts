import type { Failure } from './failure.ts';
import type { Unit } from './symbols.ts';
import { parseUnit } from './unit.ts';

/** A number and the unit behind it, as written and as understood. */
export interface Measure {
  readonly mantissa: string;
  readonly exponent: number;
  /** As written, sign and exponent included. */
  readonly number: string;
  readonly unitText: string;
  /** Nothing if no unit is written. */
  readonly unit: Unit | undefined;
}

const NUMBER = /^([+-]?(?:\d+\.?\d*|\.\d+))(?:[eE]([+-]?\d+))?\s*/;
const UNIT_START = /^(?:1?\s*\/|[^\d\s.,;:*^+\-_'~<>=!?"#&|@])/;

/** Splits `NUMBER [UNIT]`; `offset` is where it starts in the whole text, for the ranges of failures. */
export function readMeasure(text: string, offset: number): Measure | Failure {
  const match = NUMBER.exec(text);
  if (match === null) return { failure: 'number', start: offset, end: offset + text.length };
  const [whole, mantissa = '', exponent] = match;
  const unitText = text.slice(whole.length);
  const number = whole.trimEnd();
  const power = exponent === undefined ? 0 : Number(exponent);
  if (unitText === '') return { mantissa, exponent: power, number, unitText, unit: undefined };
  if (!UNIT_START.test(unitText)) return { failure: 'number', start: offset, end: offset + text.length };
  const unit = parseUnit(unitText);
  if ('fault' in unit) {
    return { failure: 'unit', start: offset + whole.length, end: offset + text.length, detail: unit };
  }
  return { mantissa, exponent: power, number, unitText, unit };
}

/** The number in SI, without a temperature's zero; powers of ten go through the decimal text, so they never round. */
export function toSi(measure: Measure, unit: Unit | undefined): number {
  // Bounded, because a power printed as `1e+21` would not read back.
  const written = Math.max(-9999, Math.min(9999, measure.exponent));
  if (unit === undefined) return Number(`${measure.mantissa}e${written}`);
  const power = written + unit.exponent;
  if (unit.times === 1 && unit.over === 1) return Number(`${measure.mantissa}e${power}`);
  const scaled = (Number(measure.mantissa) * unit.times) / unit.over;
  const printed = String(scaled);
  return printed.includes('e') ? scaled * 10 ** power : Number(`${printed}e${power}`);
}

/** Whether a number that isn't zero became zero. */
export function vanishes(measure: Measure, value: number): boolean {
  return value === 0 && /[1-9]/.test(measure.mantissa);
}
