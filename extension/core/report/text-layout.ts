import type { DimensionName } from '../quantity/dimension.ts';
import { formatQuantity } from '../quantity/format.ts';

const WIDTH = 80;
const LABEL = 28;
const VALUE = 12;
const INDENT = 2;
const GAP = 3;

/** A line of label, value and note; no line where there is no value. */
export function row(label: string, value: string | undefined, note?: string): string[];
export function row(label: string, value: number | undefined, dimension: DimensionName, note?: string): string[];
export function row(label: string, value: number | string | undefined, third = '', note = ''): string[] {
  if (value === undefined) return [];
  const text = typeof value === 'number' ? formatQuantity(value, third as DimensionName) : value;
  const beside = typeof value === 'number' ? note : third;
  return [`  ${label.padEnd(LABEL)}${text.padStart(VALUE)}${beside ? `   ${beside}` : ''}`];
}

/** A text of the file made fit for a terminal: no line breaks, no control characters, no changes of direction. */
export function oneLine(text: string): string {
  return text.replace(/[\p{Cc}\p{Zl}\p{Zp}\p{Bidi_Control}\s]+/gu, ' ').trim();
}

/** Columns under a heading, the first to the left, cut so that a line stays within 80. */
export function table(heading: readonly string[], rows: readonly (readonly string[])[]): string[] {
  const widths = heading.map((title, i) => Math.max(title.length, ...rows.map((cells) => (cells[i] ?? '').length)));
  const others = widths.slice(1).reduce((sum, width) => sum + width + GAP, 0);
  const first = Math.min(widths[0] ?? 0, WIDTH - INDENT - others);
  const rest = (cells: readonly string[]) =>
    cells
      .slice(1)
      .map((cell, i) => ' '.repeat(GAP) + cell.padStart(widths[i + 1] ?? 0))
      .join('')
      .trimEnd();
  const body = rows.map((cells) => ' '.repeat(INDENT) + clip(cells[0] ?? '', first).padEnd(first) + rest(cells));
  return [(heading[0] ?? '').padEnd(first + INDENT) + rest(heading), ...body];
}

/** A text broken at spaces, or within a word that is longer than a line, into lines of at most 80, later ones indented. */
export function wrapped(text: string, indent: number): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of words(text, WIDTH - indent)) {
    if (line && line.length + 1 + word.length > WIDTH) {
      lines.push(line);
      line = ' '.repeat(indent) + word;
    } else line = line ? `${line} ${word}` : word;
  }
  return line ? [...lines, line] : lines;
}

/** Words with the blanks before the first; one longer than `most` falls into pieces. */
function words(text: string, most: number): string[] {
  const pieces = new RegExp(`.{1,${most}}`, 'gsu');
  const whole = text.trimEnd().split(/(?<=\S) +/);
  return whole.flatMap((word) => (word.length > most ? (word.match(pieces) ?? []) : [word]));
}

function clip(text: string, width: number): string {
  return text.length <= width ? text : `${text.slice(0, Math.max(0, width - 1)).replace(/[\ud800-\udbff]$/, '')}…`;
}
