import type { ErrorCode } from 'yaml';
import type { TextRange } from '../report/problem.ts';
import type { FindingDetail } from './finding.ts';

const PLAIN_WORDS: Partial<Record<ErrorCode, string>> = {
  ALIAS_PROPS: 'An alias stands alone: no anchor and no tag before it.',
  BAD_ALIAS: 'This anchor or alias has no usable name. Write `&name` and `*name`.',
  BAD_COLLECTION_TYPE: 'This tag does not fit the value behind it. Remove the tag.',
  BAD_DQ_ESCAPE: 'No such escape in double quotes. Write the backslash twice, or use single quotes.',
  BAD_INDENT: 'The indentation does not fit the lines around it. Keys of one section begin in the same column.',
  BAD_PROP_ORDER: 'An anchor or tag stands after its mark, before its value.',
  BAD_SCALAR_START: 'A plain value cannot begin with this character. Put the value in quotes.',
  BLOCK_AS_IMPLICIT_KEY: 'A second `:` on this line. Put the value in quotes, or the inner key on a line of its own.',
  BLOCK_IN_FLOW: 'Between braces or brackets, entries are separated by commas, not by lines and dashes.',
  KEY_OVER_1024_CHARS: 'This key is longer than YAML allows. Is a line break missing?',
  MULTILINE_IMPLICIT_KEY: 'A key must fit on one line. Is a `:` missing here, or the space after it?',
  MULTIPLE_ANCHORS: 'One value has one anchor.',
  MULTIPLE_TAGS: 'One value has one tag.',
  NON_STRING_KEY: 'A key must be plain text.',
  TAB_AS_INDENT: 'Indentation is made of spaces, not tabs.',
  TAG_RESOLVE_FAILED: 'Tags have no meaning in a design. Remove it.',
  UNEXPECTED_TOKEN: 'Nothing of this kind can stand here. Is a quote, a comma or a bracket out of place?',
};

/** What a fault of the YAML text means, in words that need no YAML standard beside them, and its mending. */
export function explainSyntax(
  code: ErrorCode,
  original: string,
  text: string,
  range: TextRange,
): [message: string, detail: FindingDetail] {
  if (code === 'MISSING_CHAR') return [missingCharacter(original), {}];
  const message = PLAIN_WORDS[code] ?? 'The text cannot be read as YAML from here.';
  if (code !== 'TAB_AS_INDENT' || text[range.start] !== '\t') return [message, {}];
  return [message, { fixes: [{ title: 'Replace the tab by two spaces', range, text: '  ' }] }];
}

function missingCharacter(original: string): string {
  if (/quote/.test(original)) return 'The closing quote of this value is missing.';
  if (/block collections/i.test(original))
    return 'A space is missing: keys are written `key: value`, list items `- item`.';
  const wanted = /(?:end with a|Missing) (\S)/.exec(original)?.[1];
  if (wanted !== undefined && '}],'.includes(wanted)) return `A \`${wanted}\` is missing here.`;
  if (/implicit keys need to be followed by map values|implicit map keys/i.test(original)) {
    return 'A key stands here without `: ` and a value.';
  }
  return 'A mark is missing here: a `:` with a space behind it, a comma, or a closing bracket.';
}
