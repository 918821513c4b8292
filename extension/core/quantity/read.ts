import { DIMENSIONS, type DimensionName, sameDimension } from './dimension.ts';
import type { Failure } from './failure.ts';
import { type Measure, readMeasure, toSi, vanishes } from './measure.ts';
import type { Quantity } from './quantity.ts';
import { CELSIUS_ZERO } from './symbols.ts';

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
  // In hundredths, so that -40 Cel is exactly 233.15 K; and -0 becomes 0.
  const value = main.unit?.kind === 'celsius' ? (magnitude * 100 + CELSIUS_ZERO) / 100 : magnitude + 0;
  if (!Number.isFinite(written) || !Number.isFinite(value)) return { failure: 'overflow', start: 0, end };
  if (vanishes(main, written) || vanishes(main, magnitude)) return { failure: 'underflow', start: 0, end };
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
