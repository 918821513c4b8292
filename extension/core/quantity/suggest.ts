import { DIMENSIONS, type DimensionName, sameDimension } from './dimension.ts';
import { SYMBOLS } from './symbols.ts';
import { parseUnit } from './unit.ts';
import { spelledOut } from './unit-words.ts';

const MOST = 4;
const LONGEST_UNIT = 20;

/**
 * Units of the wanted dimension that look like an unreadable one, of which `from` to `to` is to blame: first what
 * differs from a usual unit by case or spelling alone, then full names (`microseconds`), then one wrong character.
 */
export function suggestUnits(unit: string, from: number, to: number, dimension: DimensionName): readonly string[] {
  if (unit.length > LONGEST_UNIT) return [];
  const usual = DIMENSIONS[dimension].units;
  const replaced = (by: string): string => unit.slice(0, from) + by + unit.slice(to);
  const fits = (candidate: string): boolean => {
    const parsed = parseUnit(candidate);
    return !('fault' in parsed) && sameDimension(parsed.vector, DIMENSIONS[dimension].vector);
  };
  const bad = unit.slice(from, to);
  const stages: readonly (() => readonly string[])[] = [
    () => usual.filter((other) => folded(other) === folded(unit)),
    () => [...SYMBOLS.keys()].filter((symbol) => symbol.toLowerCase() === bad.toLowerCase()).map(replaced),
    () => spelledOut(bad).map(replaced),
    () => usual.filter((other) => withinOneEdit(folded(other), folded(unit))),
    () => [...SYMBOLS.keys()].filter((symbol) => symbol.length > 1 && withinOneEdit(symbol, bad)).map(replaced),
  ];
  for (const stage of stages) {
    const found = stage().filter(fits).slice(0, MOST);
    if (found.length > 0) return found;
  }
  return [];
}

function folded(unit: string): string {
  return unit
    .toLowerCase()
    .replace(/[\u00b5\u03bc]/g, 'u')
    .replace(/\*\*|[\^\s]/g, '');
}

/** One character added, left out or changed, or two neighbours swapped, in something longer than one character. */
function withinOneEdit(one: string, other: string): boolean {
  if (Math.abs(one.length - other.length) > 1 || Math.min(one.length, other.length) < 2) return false;
  let head = 0;
  while (head < one.length && one[head] === other[head]) head++;
  const tail = (text: string, skip: number): string => text.slice(head + skip);
  return (
    tail(one, 1) === tail(other, 1) ||
    tail(one, 1) === tail(other, 0) ||
    tail(one, 0) === tail(other, 1) ||
    (one[head] === other[head + 1] && one[head + 1] === other[head] && tail(one, 2) === tail(other, 2))
  );
}
