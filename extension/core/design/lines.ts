import type { TextRange } from '../report/problem.ts';

/** The line that holds an offset, without its line break and the blanks around it. */
export function lineAt(text: string, offset: number): TextRange {
  const at = Math.min(Math.max(0, offset), text.length);
  let start = at;
  while (start > 0 && !isBreak(text, start - 1)) start--;
  let end = at;
  while (end < text.length && !isBreak(text, end)) end++;
  while (start < end && isBlank(text, start)) start++;
  while (end > start && isBlank(text, end - 1)) end--;
  return { start, end };
}

/**
 * A range that shows: within one line, without blanks at its ends, at least one character long where the text allows.
 * What begins past the last character of a line is shown at that character.
 */
export function tighten(text: string, from: number, to: number): TextRange {
  let start = Math.min(Math.max(0, from), text.length);
  while (start > 0 && (start === text.length || isBreak(text, start) || isBlank(text, start))) start--;
  let end = start + 1;
  const limit = Math.min(to, text.length);
  while (end < limit && !isBreak(text, end)) end++;
  while (end > start + 1 && isBlank(text, end - 1)) end--;
  return { start, end: Math.min(end, text.length) };
}

/** From the next character that is neither blank nor break to the end of its line, or the last word of the text. */
export function nextWord(text: string, from: number): TextRange {
  let start = Math.max(0, from);
  while (start < text.length && (isBreak(text, start) || isBlank(text, start))) start++;
  return start < text.length ? lineAt(text, start) : tighten(text, from, from + 1);
}

/** A line's range without the comment at its end. */
export function withoutNote(text: string, line: TextRange): TextRange {
  const code = text.slice(line.start, Math.min(line.end, line.start + 1000)).split(/\s+#/)[0] ?? '';
  return { start: line.start, end: Math.min(line.end, line.start + Math.max(1, code.length)) };
}

function isBreak(text: string, at: number): boolean {
  const code = text.charCodeAt(at);
  return code === 10 || code === 13;
}

function isBlank(text: string, at: number): boolean {
  const code = text.charCodeAt(at);
  return code === 32 || code === 9;
}
