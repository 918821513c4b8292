import type { ErrorCode, YAMLError } from 'yaml';
import type { Fix, TextRange } from '../report/problem.ts';
import { lineAt, nextWord, tighten, withoutNote } from './lines.ts';

/** A fault of the YAML text in words that need no YAML standard beside them. */
export interface SyntaxFault {
  readonly range: TextRange;
  readonly message: string;
  readonly fixes: readonly Fix[];
  /** What else the parser misread for it. */
  readonly misread?: TextRange;
}

const PLAIN_WORDS: Partial<Record<ErrorCode, string>> = {
  ALIAS_PROPS: 'An alias stands alone: no anchor and no tag before it.',
  BAD_ALIAS: 'This anchor or alias has no usable name. Write `&name` and `*name`.',
  BAD_COLLECTION_TYPE: 'This tag does not fit the value behind it. Remove the tag.',
  BAD_DQ_ESCAPE: 'No such escape in double quotes. Write the backslash twice, or use single quotes.',
  BAD_PROP_ORDER: 'An anchor or tag stands after its mark, before its value.',
  BAD_SCALAR_START: 'A plain value cannot begin with this character. Put the value in quotes.',
  BLOCK_IN_FLOW: 'Between braces or brackets, entries are separated by commas, not by lines and dashes.',
  KEY_OVER_1024_CHARS: 'This key is longer than YAML allows. Is a line break missing?',
  MULTIPLE_ANCHORS: 'One value has one anchor.',
  MULTIPLE_TAGS: 'One value has one tag.',
  TAG_RESOLVE_FAILED: 'Tags have no meaning in a design. Remove it.',
  UNEXPECTED_TOKEN: 'Nothing of this kind can stand here. Is a quote, a comma or a bracket out of place?',
};

/** What a fault means, where it shows best, and its mending. */
export function explainSyntax(fault: YAMLError, text: string): SyntaxFault {
  const [from, to] = fault.pos;
  const range = tighten(text, from, to);
  switch (fault.code) {
    case 'TAB_AS_INDENT':
      return explainTab(text, from);
    case 'BAD_INDENT':
      return explainIndent(text, from);
    case 'BLOCK_AS_IMPLICIT_KEY':
      return explainSecondKey(text, from);
    case 'MULTILINE_IMPLICIT_KEY':
      return explainLongKey(text, from, to);
    case 'MISSING_CHAR':
      return explainMissing(text, range, fault.message);
    default:
      return { range, message: PLAIN_WORDS[fault.code] ?? 'The text cannot be read as YAML from here.', fixes: [] };
  }
}

function explainTab(text: string, from: number): SyntaxFault {
  let end = from;
  while (text[end] === '\t') end++;
  const range = end > from ? { start: from, end } : tighten(text, from, from + 1);
  const fixes = end > from ? [{ title: 'Replace tabs by spaces', range, text: '  '.repeat(end - from) }] : [];
  return { range, message: 'Indentation is made of spaces, not tabs.', fixes };
}

function explainIndent(text: string, from: number): SyntaxFault {
  const message = 'The indentation does not fit the lines around it: keys of one section begin in the same column.';
  return { range: withoutNote(text, nextWord(text, from)), message, fixes: [] };
}

/** Either two colons on one line, or a line indented as if it belonged to the value above. */
function explainSecondKey(text: string, from: number): SyntaxFault {
  const line = lineAt(text, from);
  const code = text.slice(line.start, Math.min(line.end, line.start + 1000)).split(/\s#/)[0] ?? '';
  if ((code.match(/:(?=\s|$)/g)?.length ?? 0) > 1) {
    const range = { start: from, end: Math.max(from + 1, line.start + code.trimEnd().length) };
    return {
      range,
      message: 'A second `:` on this line. Put the value in quotes, or the inner key on its own line.',
      fixes: [],
    };
  }
  return explainDeeper(text, from);
}

function explainLongKey(text: string, from: number, to: number): SyntaxFault {
  const line = lineAt(text, from);
  if (line.start < from && !/^(?:- +)*$/.test(text.slice(line.start, from))) return explainDeeper(text, from);
  const message = 'This line has no `: ` of its own. Is the `:` missing, or the space after it?';
  return { range: tighten(text, from, to), message, fixes: [], misread: { start: from, end: to } };
}

function explainDeeper(text: string, from: number): SyntaxFault {
  const line = lineAt(text, from);
  const range = withoutNote(text, nextWord(text, line.end));
  const message = 'This line is indented deeper than the key above it, which already has its value.';
  return { range, message, fixes: [], misread: { start: line.start, end: range.end } };
}

function explainMissing(text: string, range: TextRange, original: string): SyntaxFault {
  const word = text.slice(range.start, Math.min(range.end, range.start + 200));
  const glued = /^([\w-]+):(?=\S)/.exec(word);
  if (glued?.[1] !== undefined) {
    const at = range.start + glued[0].length;
    const fixes = [{ title: 'Put a space after the `:`', range: { start: at, end: at }, text: ' ' }];
    return { range, message: 'A space is missing after the `:`.', fixes };
  }
  if (/map values|implicit map keys/i.test(original))
    return { range, message: 'A key stands here without `: ` and a value.', fixes: [] };
  if (/without - indicator/.test(original)) return { range, message: 'Items of a list begin with `- `.', fixes: [] };
  if (/white space/.test(original)) return { range, message: 'A space is missing before this.', fixes: [] };
  const between = /Missing (,|, or :) between/.test(original) ? 'A comma is missing before this.' : undefined;
  return { range, message: between ?? 'A mark is missing here: a `:` with a space behind it, or a comma.', fixes: [] };
}
