import { DIMENSIONS, type DimensionName, sameDimension } from './dimension.ts';
import type { Quantity } from './quantity.ts';
import { CELSIUS_ZERO, type Unit } from './symbols.ts';
import { parseUnit, type UnitFault } from './unit.ts';

/** Why a text is no quantity, and the part of it that is to blame. */
export interface Failure {
  readonly failure:
    | 'number'
    | 'missing-unit'
    | 'unit'
    | 'dimension'
    | 'overflow'
    | 'underflow'
    | 'tolerance-empty'
    | 'tolerance-unreadable'
    | 'tolerance-negative'
    | 'tolerance-dimension'
    | 'tolerance-celsius-percent';
  readonly start: number;
  readonly end: number;
  /** For a unit that can't be read: what is wrong within `start` to `end`. */
  readonly detail?: UnitFault;
}

interface Measure {
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

/** `±`, `+/-` or `+-`; not global, so that it holds no state. */
export const PLUS_MINUS = /\u00b1|\+\/?[-\u2212]/;

/** Reads a trimmed text; says where it fails rather than how to put it right (that is `explain`). */
export function read(text: string, dimension: DimensionName): Quantity | Failure {
  const mark = text.search(PLUS_MINUS);
  const main = readMeasure(mark < 0 ? text : text.slice(0, mark).trimEnd(), 0);
  if ('failure' in main) return main;
  const { vector } = DIMENSIONS[dimension];
  const end = mark < 0 ? text.length : text.slice(0, mark).trimEnd().length;
  if (main.unit === undefined && dimension !== 'ratio') return { failure: 'missing-unit', start: 0, end };
  if (main.unit !== undefined && !sameDimension(main.unit.vector, vector))
    return { failure: 'dimension', start: 0, end };

  const written = Number(main.number);
  const magnitude = toSi(main, main.unit);
  if (!Number.isFinite(written) || !Number.isFinite(magnitude)) return { failure: 'overflow', start: 0, end };
  if (vanishes(main, written) || vanishes(main, magnitude)) return { failure: 'underflow', start: 0, end };
  // Adding zero turns -0 into 0.
  const value = main.unit?.kind === 'celsius' ? magnitude + CELSIUS_ZERO : magnitude + 0;
  const unit = main.unitText;
  if (mark < 0) return { value, written, unit };
  const tolerance = readTolerance(text, mark, main, magnitude, dimension);
  return typeof tolerance === 'number' ? { value, written, unit, tolerance } : tolerance;
}

/** The half-width in SI. A ratio unit is relative to the number, unless the number itself is written in one. */
function readTolerance(
  text: string,
  mark: number,
  main: Measure,
  magnitude: number,
  dimension: DimensionName,
): number | Failure {
  const sign = PLUS_MINUS.exec(text)?.[0] ?? '';
  const rest = text.slice(mark + sign.length);
  const start = text.length - rest.trimStart().length;
  const end = text.length;
  if (start === end) return { failure: 'tolerance-empty', start: mark, end };
  if (PLUS_MINUS.test(rest)) return { failure: 'tolerance-unreadable', start, end };
  const written = readMeasure(text.slice(start), start);
  if ('failure' in written) {
    return written.failure === 'unit' ? written : { failure: 'tolerance-unreadable', start, end };
  }
  const relative = written.unit?.kind === 'ratio' && (dimension !== 'ratio' || main.unit === undefined);
  if (relative && main.unit?.kind === 'celsius') return { failure: 'tolerance-celsius-percent', start, end };
  const unit = written.unit ?? main.unit;
  if (!relative && unit !== undefined && !sameDimension(unit.vector, DIMENSIONS[dimension].vector)) {
    return { failure: 'tolerance-dimension', start, end };
  }
  const width = toSi(written, unit) * (relative ? Math.abs(magnitude) : 1);
  if (!Number.isFinite(width)) return { failure: 'overflow', start, end };
  if (vanishes(written, width) && magnitude !== 0) return { failure: 'underflow', start, end };
  return width < 0 ? { failure: 'tolerance-negative', start, end } : width + 0;
}

function readMeasure(text: string, offset: number): Measure | Failure {
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
function toSi(measure: Measure, unit: Unit | undefined): number {
  // Bounded, because a power printed as `1e+21` would not read back.
  const written = Math.max(-9999, Math.min(9999, measure.exponent));
  if (unit === undefined) return Number(`${measure.mantissa}e${written}`);
  const power = written + unit.exponent;
  if (unit.times === 1 && unit.over === 1) return Number(`${measure.mantissa}e${power}`);
  const scaled = (Number(measure.mantissa) * unit.times) / unit.over;
  const printed = String(scaled);
  return printed.includes('e') ? scaled * 10 ** power : Number(`${printed}e${power}`);
}

function vanishes(measure: Measure, value: number): boolean {
  return value === 0 && /[1-9]/.test(measure.mantissa);
}
