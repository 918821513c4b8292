import { type CST, Lexer, Parser } from 'yaml';
import type { Findings } from './finding.ts';
import { lineAt, withoutNote } from './lines.ts';
import { returnSiblings } from './repair.ts';

/** Bounds on the work that one text can cause; a design of 300 lines has some 4,000 tokens. */
export const MAX_TOKENS = 50_000;
export const MAX_DEPTH = 64;
/** Backslashes in double quotes: each wrong one costs an error object, and a design needs none. */
export const MAX_ESCAPES = 1_000;

/** A quote or bracket without its partner. */
export interface Unclosed {
  readonly offset: number;
  readonly mark: string;
}

/** Tokens of the first document. Directives are passed over: a design is YAML 1.2 whatever its `%YAML` line says. */
export function firstDocument(text: string, findings: Findings): { tokens: CST.Token[]; complete: boolean } {
  const parser = new Parser();
  const tokens: CST.Token[] = [];
  let seen = false;
  let count = 0;
  const take = (parsed: Iterable<CST.Token>): boolean => {
    for (const token of parsed) {
      if (token.type === 'directive') continue;
      if (token.type === 'document') {
        if (seen) {
          const message = 'A second document begins here; only the first is read.';
          findings.add('several-documents', '', withoutNote(text, lineAt(text, token.offset)), message);
          return false;
        }
        seen = true;
      }
      tokens.push(token);
    }
    return true;
  };
  for (const lexeme of new Lexer().lex(text)) {
    if (++count > MAX_TOKENS) {
      const message = `More than ${MAX_TOKENS} words and marks: what follows is not read.`;
      findings.add('file-too-large', '', withoutNote(text, lineAt(text, parser.offset)), message);
      take(parser.end());
      return { tokens, complete: false };
    }
    if (!take(parser.next(lexeme))) return { tokens, complete: true };
  }
  take(parser.end());
  return { tokens, complete: true };
}

export interface PreparedTokens {
  /** Where the first value stood that was nested too deep. */
  readonly tooDeep: number | undefined;
  /** Where the first quoted value stood that has one escape too many. */
  readonly escaped: number | undefined;
  readonly unclosed: readonly Unclosed[];
}

/**
 * Empties what lies deeper than the bound or holds too many escapes, lists what is not closed, and mends what it can.
 * The composer is recursive: 100,000 opening braces would end the process, not only the call.
 */
export function prepareTokens(tokens: readonly CST.Token[]): PreparedTokens {
  const unclosed: Unclosed[] = [];
  let tooDeep: number | undefined;
  let escaped: number | undefined;
  let escapes = 0;
  let level: readonly CST.Token[] = tokens;
  for (let depth = 0; level.length > 0; depth++) {
    const next: CST.Token[] = [];
    for (const token of level) {
      const mark = unclosedMark(token);
      if (mark !== undefined) unclosed.push({ offset: token.offset, mark });
      if (token.type === 'document' && token.value !== undefined) next.push(token.value);
      if (token.type === 'double-quoted-scalar') {
        escapes += token.source.split('\\').length - 1;
        if (escapes > MAX_ESCAPES) {
          escaped = Math.min(escaped ?? token.offset, token.offset);
          token.source = '""';
        }
      }
      if (token.type === 'block-map') returnSiblings(token);
      if (!('items' in token)) continue;
      if (depth > MAX_DEPTH) {
        tooDeep = Math.min(tooDeep ?? token.offset, token.offset);
        token.items.length = 0;
      }
      for (const item of token.items) {
        if (item.key) next.push(item.key);
        if (item.value) next.push(item.value);
      }
    }
    level = next;
  }
  return { tooDeep, escaped, unclosed: tooDeep === undefined ? unclosed : [] };
}

function unclosedMark(token: CST.Token): string | undefined {
  switch (token.type) {
    case 'flow-collection': {
      const closed = token.end.some(({ source }) => source === '}' || source === ']');
      return closed ? undefined : token.start.source;
    }
    case 'double-quoted-scalar':
    case 'single-quoted-scalar': {
      const quote = token.source[0] ?? '';
      // A last quote that is escaped, or doubled, closes nothing.
      const body = token.source.slice(1);
      const closed = quote === '"' ? /(?:^|[^\\])(?:\\\\)*"$/.test(body.slice(-100)) : body.endsWith("'");
      return closed ? undefined : quote;
    }
    default:
      return undefined;
  }
}
