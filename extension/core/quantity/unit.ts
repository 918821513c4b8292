import type { DimensionVector } from './dimension.ts';
import { SYMBOLS, type Unit } from './symbols.ts';

/** Where and why a unit can't be read; offsets within its text. */
export interface UnitFault {
  readonly fault: 'unknown' | 'malformed' | 'ambiguous' | 'celsius';
  readonly start: number;
  readonly end: number;
}

interface Cursor {
  readonly text: string;
  at: number;
  fault: UnitFault | undefined;
}

/** The product so far. */
interface Product {
  exponent: number;
  times: number;
  over: number;
  readonly vector: [number, number, number, number, number, number];
}

const SPACES = ' \t\r\n\u00a0\u2009\u202f';
const DOTS = '.*\u00b7\u22c5';
const SUPERSCRIPTS = '\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079';
const MINUSES = '-\u2212\u207b';
const NOT_IN_SYMBOL = `${SPACES}${DOTS}${SUPERSCRIPTS}${MINUSES}/()^+\u207a0123456789`;

/**
 * Reads a unit expression, trimmed: symbols with integer powers, joined by `.`, `*`, `·` or a space, and at most one `/`
 * outside parentheses, because `W/m K` means different things to different readers. Degrees Celsius stand alone only.
 */
export function parseUnit(text: string): Unit | UnitFault {
  const single = SYMBOLS.get(text);
  if (single !== undefined) return single;
  const cursor: Cursor = { text, at: 0, fault: undefined };
  const product = emptyProduct();
  readExpression(cursor, product, 1);
  if (cursor.fault === undefined && cursor.at < text.length) fail(cursor, 'malformed', cursor.at);
  if (cursor.fault !== undefined) return cursor.fault;
  const vector: DimensionVector = product.vector;
  const kind = vector.every((power) => power === 0) ? 'ratio' : 'plain';
  return { exponent: product.exponent, times: product.times, over: product.over, vector, kind };
}

function readExpression(cursor: Cursor, product: Product, sign: number): void {
  skipSpaces(cursor);
  if (cursor.text[cursor.at] === '1' && isSlashNext(cursor, cursor.at + 1)) {
    cursor.at++;
    skipSpaces(cursor);
  } else if (cursor.text[cursor.at] !== '/') {
    do readFactor(cursor, product, sign);
    while (cursor.fault === undefined && skipProductSign(cursor));
  }
  if (cursor.fault !== undefined || cursor.text[cursor.at] !== '/') return;
  cursor.at++;
  skipSpaces(cursor);
  const denominator = cursor.at;
  readFactor(cursor, product, -sign);
  if (cursor.fault !== undefined) return;
  if (skipProductSign(cursor) || cursor.text[cursor.at] === '/') {
    cursor.at = endOfLevel(cursor);
    fail(cursor, 'ambiguous', denominator);
  }
}

function readFactor(cursor: Cursor, product: Product, sign: number): void {
  const start = cursor.at;
  if (cursor.text[start] === '(') {
    const inner = readGroup(cursor);
    if (cursor.fault === undefined) multiply(product, inner, sign * readPower(cursor));
    return;
  }
  while (isInSymbol(cursor)) cursor.at++;
  const unit = SYMBOLS.get(cursor.text.slice(start, cursor.at));
  if (cursor.at === start) fail(cursor, 'malformed', start);
  else if (unit === undefined) fail(cursor, 'unknown', start);
  else if (unit.kind === 'celsius') fail(cursor, 'celsius', start);
  // A percentage may lead a quotient (`%/cm`), but `5 % mm` is more likely a slip than a product.
  else if (unit.kind === 'ratio' && (start > 0 || !isSlashNext(cursor, cursor.at))) fail(cursor, 'malformed', start);
  else multiply(product, unit, sign * readPower(cursor));
}

function isInSymbol(cursor: Cursor): boolean {
  // Letters, nearly always; the comparison spares them the search.
  const code = cursor.text.charCodeAt(cursor.at) | 32;
  if (code >= 97 && code <= 122) return true;
  return cursor.at < cursor.text.length && !NOT_IN_SYMBOL.includes(cursor.text[cursor.at]!);
}

function readGroup(cursor: Cursor): Product {
  const start = cursor.at;
  const inner = emptyProduct();
  cursor.at++;
  readExpression(cursor, inner, 1);
  if (cursor.text[cursor.at] !== ')') fail(cursor, 'malformed', start);
  cursor.at++;
  return inner;
}

/** The power after a symbol: `2`, `-2`, `^2`, `**-2`, `⁻²`; 1 if there is none. Only 1 to 9 mean anything here. */
function readPower(cursor: Cursor): number {
  const { text } = cursor;
  const start = cursor.at;
  if (text[start] === '^') cursor.at++;
  else if (text.startsWith('**', start)) cursor.at += 2;
  const marked = cursor.at > start;
  let sign = 1;
  if (cursor.at < text.length && MINUSES.includes(text[cursor.at]!)) {
    sign = -1;
    cursor.at++;
  }
  const digit = digitAt(text, cursor.at);
  if (digit < 0 && !marked && sign > 0) return 1;
  cursor.at++;
  if (digit < 1 || digitAt(text, cursor.at) >= 0) fail(cursor, 'malformed', start);
  return sign * digit;
}

function digitAt(text: string, at: number): number {
  const character = text[at];
  if (character === undefined) return -1;
  const digit = '0123456789'.indexOf(character);
  return digit >= 0 ? digit : SUPERSCRIPTS.indexOf(character);
}

function skipSpaces(cursor: Cursor): boolean {
  const start = cursor.at;
  while (cursor.at < cursor.text.length && SPACES.includes(cursor.text[cursor.at]!)) cursor.at++;
  return cursor.at > start;
}

/** Passes a product sign, which a space may be; false before `/`, `)` and the end. */
function skipProductSign(cursor: Cursor): boolean {
  const spaced = skipSpaces(cursor);
  const next = cursor.text[cursor.at];
  if (next === undefined || next === '/' || next === ')') return false;
  if (!DOTS.includes(next)) return spaced;
  cursor.at++;
  skipSpaces(cursor);
  return true;
}

function isSlashNext(cursor: Cursor, at: number): boolean {
  return /^\s*\//.test(cursor.text.slice(at));
}

function endOfLevel(cursor: Cursor): number {
  let depth = 0;
  for (let at = cursor.at; at < cursor.text.length; at++) {
    if (cursor.text[at] === '(') depth++;
    if (cursor.text[at] === ')' && --depth < 0) return at;
  }
  return cursor.text.length;
}

function fail(cursor: Cursor, fault: UnitFault['fault'], start: number): void {
  const end = Math.min(cursor.text.length, Math.max(cursor.at, start + 1));
  cursor.fault ??= { fault, start: Math.min(start, end), end };
}

function emptyProduct(): Product {
  return { exponent: 0, times: 1, over: 1, vector: [0, 0, 0, 0, 0, 0] };
}

function multiply(product: Product, unit: Product | Unit, power: number): void {
  product.exponent += power * unit.exponent;
  const repeats = Math.abs(power);
  product.times *= (power > 0 ? unit.times : unit.over) ** repeats;
  product.over *= (power > 0 ? unit.over : unit.times) ** repeats;
  const { vector } = product;
  vector[0] += power * unit.vector[0];
  vector[1] += power * unit.vector[1];
  vector[2] += power * unit.vector[2];
  vector[3] += power * unit.vector[3];
  vector[4] += power * unit.vector[4];
  vector[5] += power * unit.vector[5];
}
