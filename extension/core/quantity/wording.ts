import { DIMENSIONS, type DimensionName, sameDimension } from './dimension.ts';
import { parseUnit } from './unit.ts';

/** Enough of a text to recognise it in a message, on one line. */
export function excerpt(text: string, most = 40): string {
  const line = text.slice(0, most + 1).replace(/[\p{Cc}\p{Zl}\p{Zp}`]/gu, ' ');
  return line.length <= most ? line : `${line.slice(0, most - 1).replace(/[\ud800-\udbff]$/, '')}…`;
}

/** What should have been there, with an example. */
export function expected(dimension: DimensionName): string {
  const { noun, example } = DIMENSIONS[dimension];
  return `expected ${noun} such as \`${example}\``;
}

/** What a tolerance of this dimension looks like. */
export function toleranceWanted(dimension: DimensionName): string {
  const unit = DIMENSIONS[dimension].units[0] ?? '%';
  return unit === '%' ? 'expected one such as `± 2 %`' : `expected one such as \`± 2 %\` or \`± 0.1 ${unit}\``;
}

/** Alternatives as a person lists them. */
export function listed(words: readonly string[]): string {
  const quoted = words.map((word) => `\`${excerpt(word)}\``);
  return quoted.length < 2 ? quoted.join() : `${quoted.slice(0, -1).join(', ')} or ${quoted.at(-1)}`;
}

/** `is a length`, or that it is not what was wanted where its dimension has no name here. */
export function whatItIs(text: string, wanted: DimensionName): string {
  const unit = text.replace(/^[+-]?[\d.]+(?:[eE][+-]?\d+)?\s*/, '');
  const parsed = parseUnit(unit);
  if ('fault' in parsed) return `is not ${DIMENSIONS[wanted].noun}`;
  const same = Object.values(DIMENSIONS).filter((row) => sameDimension(row.vector, parsed.vector));
  const named = same.find((row) => row.units.includes(unit)) ?? same[0];
  return named === undefined ? `is not ${DIMENSIONS[wanted].noun}` : `is ${named.noun}`;
}
