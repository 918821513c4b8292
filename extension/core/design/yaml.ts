import { Composer, type Document, isScalar, type YAMLError } from 'yaml';
import type { Findings } from './finding.ts';
import { lineAt } from './lines.ts';
import { explainSyntax, type SyntaxFault } from './syntax.ts';
import { firstDocument, MAX_DEPTH, MAX_ESCAPES, prepareTokens, type Unclosed } from './tokens.ts';

/** The longest text that is read, in UTF-16 units; a design of 300 lines has 15,000. */
export const MAX_CHARACTERS = 2_000_000;

export interface ParsedYaml {
  readonly document: Document.Parsed;
  /** Some of the text could not be read, so what seems missing may be there. */
  readonly partial: boolean;
}

/** The first document of a text, or undefined where the text can't be a design at all (a problem then says why). */
export function parseYaml(text: string, findings: Findings): ParsedYaml | undefined {
  if (!isReadable(text, findings)) return undefined;
  const { tokens, complete } = firstDocument(text, findings);
  const { tooDeep, escaped, unclosed } = prepareTokens(tokens);
  if (tooDeep !== undefined) {
    const message = `More than ${MAX_DEPTH} levels deep: a design needs five.`;
    findings.add('nested-too-deep', '', { start: tooDeep, end: tooDeep + 1 }, message);
  }
  if (escaped !== undefined) {
    const message = `More than ${MAX_ESCAPES} backslashes in quoted text: this value is not read.`;
    findings.add('file-too-large', '', { start: escaped, end: escaped + 1 }, message);
  }
  const composer = new Composer({ version: '1.2', uniqueKeys: false, prettyErrors: false, logLevel: 'silent' });
  const [document] = [...composer.compose(tokens, true, text.length)];
  if (document === undefined || 'empty' in document || (document.errors.length === 0 && isBlank(document))) {
    reportEmpty(findings);
    return undefined;
  }
  const faults = [...document.errors, ...document.warnings].filter(
    (fault) => fault.pos[0] < (tooDeep ?? text.length + 1),
  );
  reportSyntax(text, faults, unclosed, findings);
  return { document, partial: !complete || faults.length > 0 };
}

function isBlank({ contents }: Document.Parsed): boolean {
  return contents === null || (isScalar(contents) && contents.source === '' && contents.type === 'PLAIN');
}

function isReadable(text: string, findings: Findings): boolean {
  if (text.length > MAX_CHARACTERS) {
    const message = `The file has more than ${MAX_CHARACTERS / 1e6} million characters, the most that a design may have: it is not read.`;
    findings.add('file-too-large', '', { start: 0, end: 0 }, message);
    return false;
  }
  const odd = text.search(BINARY);
  if (odd >= 0) {
    const message = `Character ${odd + 1} is none that a text has: this is a binary file, or text in another encoding. Save it as UTF-8.`;
    findings.add('not-text', '', { start: odd, end: odd + 1 }, message);
    return false;
  }
  if (CONTENT.test(text)) return true;
  reportEmpty(findings);
  return false;
}

// Control characters that YAML 1.2 excludes (5.1), and what a decoder leaves of bytes that are no UTF-8.
// biome-ignore lint/suspicious/noControlCharactersInRegex: these are the ones looked for
const BINARY = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f\ufffd\ufffe\uffff]/;
/** A line with anything but blanks, a comment, or a document marker. */
const CONTENT = /^(?!\ufeff?[ \t]*(?:#|$)|(?:---|\.\.\.)[ \t]*(?:#|$))/m;

function reportEmpty(findings: Findings): void {
  const message =
    'The file is empty. A design begins with `format: 1`, then gain_medium, pump, resonator and q_switch.';
  findings.add('empty-file', '', { start: 0, end: 0 }, message);
}

/**
 * One problem for a run of lines: what follows a slip on its line and the next ones is mostly the same slip seen again.
 * Nothing else is said of those lines.
 */
function reportSyntax(
  text: string,
  faults: readonly YAMLError[],
  unclosed: readonly Unclosed[],
  findings: Findings,
): void {
  const shown: SyntaxFault[] = [
    ...unclosed.map(({ offset, mark }) => ({
      range: { start: offset, end: offset + 1 },
      message: `This \`${mark}\` is never closed.`,
      fixes: [],
    })),
    ...faults.filter((fault) => !isAboutClosing(fault, unclosed)).map((fault) => explainSyntax(fault, text)),
  ].sort((a, b) => a.range.start - b.range.start);
  let reached = -1;
  for (const { range, message, fixes, misread } of shown) {
    if (range.start < reached) continue;
    const line = lineAt(text, range.start);
    if (reached < 0 || text.slice(reached, line.start).trim() !== '') {
      findings.add('yaml-syntax', '', range, message, { fixes });
    }
    reached = misread === undefined ? line.end : Math.max(line.end, lineAt(text, misread.end).end);
    findings.mute({ start: Math.min(line.start, misread?.start ?? line.start), end: reached });
  }
}

function isAboutClosing(fault: YAMLError, unclosed: readonly Unclosed[]): boolean {
  return unclosed.length > 0 && /closing|end with a [}\]]/.test(fault.message);
}
