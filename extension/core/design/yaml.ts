import { Composer, type CST, type Document, Lexer, Parser } from 'yaml';
import type { TextRange } from '../report/problem.ts';
import type { Findings } from './finding.ts';
import { lineAt, tighten } from './lines.ts';
import { explainSyntax } from './syntax.ts';

/** Bounds on the work that one text can cause; a design of 300 lines has some 4,000 tokens. */
export const MAX_CHARACTERS = 2_000_000;
export const MAX_TOKENS = 100_000;
export const MAX_DEPTH = 64;

/** Composed document, or undefined where the text can't be a design at all (a problem then says why). */
export function parseYaml(text: string, findings: Findings): Document.Parsed | undefined {
  if (!isReadable(text, findings)) return undefined;
  const tokens = firstDocument(text, findings);
  const tooDeep = cutBelow(tokens, MAX_DEPTH);
  if (tooDeep !== undefined) {
    const range = tighten(text, tooDeep, tooDeep + 1);
    findings.add('nested-too-deep', '', range, `More than ${MAX_DEPTH} levels deep: a design needs seven at most.`);
  }
  const composer = new Composer({ version: '1.2', uniqueKeys: false, prettyErrors: false, logLevel: 'silent' });
  const [document] = [...composer.compose(tokens, true, text.length)];
  if (document === undefined || 'empty' in document) return undefined;
  reportSyntax(text, document, findings, tooDeep);
  return document;
}

function isReadable(text: string, findings: Findings): boolean {
  if (text.length > MAX_CHARACTERS) {
    const size = (text.length / 1e6).toFixed(1);
    findings.add(
      'file-too-large',
      '',
      { start: 0, end: 0 },
      `${size} million characters; a design has 2 million at most.`,
    );
    return false;
  }
  const nul = text.search(BINARY);
  if (nul >= 0) {
    const message = `Character ${nul + 1} is none that a text has: this is a binary file, or text in another encoding. Save it as UTF-8.`;
    findings.add('not-text', '', { start: nul, end: nul + 1 }, message);
    return false;
  }
  if (text.search(CONTENT) < 0) {
    const message =
      'The file is empty. A design begins with `format: 1`, then gain_medium, pump, resonator and q_switch.';
    findings.add('empty-file', '', { start: 0, end: 0 }, message);
    return false;
  }
  return true;
}

// Control characters that YAML 1.2 excludes (5.1), and what a decoder leaves of bytes that are no UTF-8.
// biome-ignore lint/suspicious/noControlCharactersInRegex: these are the ones looked for
const BINARY = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffd]/;
/** A line with anything but blanks, a comment, or a document marker. */
const CONTENT = /^(?!\ufeff?[ \t]*(?:#|$)|(?:---|\.\.\.)[ \t]*(?:#|$))/m;

/** Tokens of the first document. Directives are passed over: a design is YAML 1.2 whatever its `%YAML` line says. */
function firstDocument(text: string, findings: Findings): CST.Token[] {
  const parser = new Parser();
  const tokens: CST.Token[] = [];
  let seen = false;
  for (const token of parsedTokens(text, parser, findings)) {
    if (token.type === 'directive') continue;
    if (token.type === 'document') {
      if (seen) {
        const range = lineAt(text, token.offset);
        findings.add('several-documents', '', range, 'A second document begins here; only the first is read.');
        break;
      }
      seen = true;
    }
    tokens.push(token);
  }
  return tokens;
}

function* parsedTokens(text: string, parser: Parser, findings: Findings): Generator<CST.Token> {
  let count = 0;
  let offset = 0;
  for (const lexeme of new Lexer().lex(text)) {
    if (++count > MAX_TOKENS) {
      const message = `More than ${MAX_TOKENS} words and marks: what follows is not read.`;
      findings.add('file-too-large', '', lineAt(text, offset), message);
      break;
    }
    offset = parser.offset;
    yield* parser.next(lexeme);
  }
  yield* parser.end();
}

/**
 * Empties what lies deeper than `depth`, and returns where the first such value stood. The composer is recursive;
 * 100,000 opening braces would end the process, not only the call.
 */
function cutBelow(tokens: readonly CST.Token[], depth: number): number | undefined {
  let first: number | undefined;
  let level: CST.Token[] = [...tokens];
  for (let reached = 0; level.length > 0; reached++) {
    const next: CST.Token[] = [];
    for (const token of level) {
      if (token.type === 'document') {
        if (token.value !== undefined) next.push(token.value);
      } else if ('items' in token) {
        if (reached >= depth) {
          first = Math.min(first ?? token.offset, token.offset);
          token.items.length = 0;
        }
        for (const item of token.items) {
          if (item.key) next.push(item.key);
          if (item.value) next.push(item.value);
        }
      }
    }
    level = next;
  }
  return first;
}

/** One problem a line: what follows on the same line is mostly the same slip seen again. */
function reportSyntax(text: string, document: Document.Parsed, findings: Findings, tooDeep: number | undefined): void {
  const faults = [...document.errors, ...document.warnings].sort((a, b) => a.pos[0] - b.pos[0]);
  let lineEnd = -1;
  for (const fault of faults) {
    if (fault.pos[0] <= lineEnd || (tooDeep !== undefined && fault.pos[0] >= tooDeep)) continue;
    const range: TextRange = tighten(text, fault.pos[0], fault.pos[1]);
    lineEnd = Math.max(lineAt(text, fault.pos[0]).end, range.end);
    findings.add('yaml-syntax', '', range, ...explainSyntax(fault.code, fault.message, text, range));
  }
}
