import { lineAt } from '../design/lines.ts';
import type { ReadDesign } from '../design/read.ts';
import { nearest } from '../design/suggest.ts';
import type { TreeNode } from '../design/tree.ts';
import { clip } from '../design/wording.ts';
import type { Fix, Problem, TextRange } from '../report/problem.ts';
import { CHECKS } from './registry.ts';

/** What acceptance comments themselves can have wrong. */
export const ACCEPTANCE_CODES = [
  { code: 'acceptance-invalid', title: 'An acceptance does not say what it must' },
  { code: 'acceptance-unused', title: 'An acceptance no longer applies' },
] as const;

/** Acceptances read of one file; what comes after accepts nothing. */
const MOST_ACCEPTANCES = 500;

/** `# accept <code>: reason` as the text has it. */
interface Acceptance {
  readonly code: string;
  readonly reason: string;
  readonly codeRange: TextRange;
  readonly range: TextRange;
  /** Where the line begins that it is about. */
  readonly line: number;
}

// A `#` opens a comment at a line's start or behind a blank; what follows must look like an acceptance, not like prose.
const COMMENT = /(?<=^|[ \t])#[ \t]*accept[ \t]+([a-z][a-z0-9-]*)[ \t]*(?::[ \t]*([^\r\n]*)|(?=\r?$))/gm;

/**
 * Applies a text's acceptances to its problems: what is accepted stays, as a note with the reason. Acceptances without a
 * reason, of unknown codes, or of what no reason can excuse are problems of their own, and so are those that nothing is
 * found for, once everything has been looked at (`judged`).
 */
export function accept(text: string, design: ReadDesign, problems: readonly Problem[], judged: boolean): Problem[] {
  if (!text.includes('accept')) return [...problems];
  const acceptances = acceptancesIn(text, design.root);
  if (acceptances.length === 0) return [...problems];
  const valid = acceptances.filter(({ code, reason }) => reason !== '' && isAcceptable(code));
  const used = new Set<Acceptance>();
  const settled = problems.map((problem): Problem => {
    const line = lineStart(text, problem.range.start);
    const found = valid.filter((one) => one.code === problem.code && one.line === line);
    for (const one of found) used.add(one);
    const [first] = found;
    if (first === undefined) return problem;
    return { ...problem, severity: 'information', accepted: { reason: first.reason, severity: problem.severity } };
  });
  const about = (one: Acceptance): Problem[] => {
    if (valid.includes(one)) return judged && !used.has(one) ? [unused(one, problems)] : [];
    return [invalid(one)];
  };
  return [...settled, ...acceptances.flatMap(about)];
}

/** Findings about a design that could be built as it is, and values that are merely unusual. */
export function isAcceptable(code: string): boolean {
  return acceptableCodes().includes(code);
}

function acceptableCodes(): string[] {
  return ['unusual-value', ...CHECKS.flatMap((check) => (check.impossible ? [] : [check.code]))];
}

function acceptancesIn(text: string, root: TreeNode | undefined): Acceptance[] {
  return [...text.matchAll(COMMENT)].slice(0, MOST_ACCEPTANCES).flatMap((match) => {
    const { index } = match;
    const [whole, code = '', reason = ''] = match;
    // Text in quotes or in a block may hold the same words.
    if (root !== undefined && insideScalar(root, index)) return [];
    const at = index + whole.indexOf(code, whole.indexOf('accept') + 'accept'.length);
    return [
      {
        code,
        reason: reason.trim(),
        codeRange: { start: at, end: at + code.length },
        range: { start: index, end: index + whole.trimEnd().length },
        line: lineMeant(text, index),
      },
    ];
  });
}

function insideScalar(node: TreeNode, offset: number): boolean {
  if (node.kind === 'scalar') return offset > node.written.start && offset < node.written.end;
  if (offset < node.extent.start || offset > node.extent.end) return false;
  for (const child of node.entries?.values() ?? node.items ?? []) if (insideScalar(child, offset)) return true;
  return false;
}

/** The comment's own line, or the first line below that is no comment where it stands alone. */
function lineMeant(text: string, comment: number): number {
  let start = lineStart(text, comment);
  while (/^[ \t]*#/.test(text.slice(start, start + 200))) {
    const next = text.indexOf('\n', start) + 1;
    if (next === 0) break;
    start = next;
  }
  return start;
}

function lineStart(text: string, offset: number): number {
  return text.lastIndexOf('\n', offset - 1) + 1;
}

function unused({ code, range }: Acceptance, problems: readonly Problem[]): Problem {
  const elsewhere = problems.some((problem) => problem.code === code);
  const why = elsewhere ? `\`${code}\` is found on another line, not here` : `\`${code}\` is not found any more`;
  const message = `This acceptance applies to nothing: ${why}. Remove it${elsewhere ? ', or move it to that line' : ''}.`;
  return { code: 'acceptance-unused', severity: 'warning', message, path: '', range, fixes: [removal(range)] };
}

function invalid({ code, range, codeRange }: Acceptance): Problem {
  const problem = { code: 'acceptance-invalid', severity: 'warning', path: '' } as const;
  if (isAcceptable(code)) {
    const message = `An acceptance needs a reason: \`# accept ${code}: why this can stand\`. Without one it accepts nothing.`;
    return { ...problem, message, range };
  }
  if (CHECKS.some((check) => check.code === code)) {
    const message = `\`${code}\` cannot be accepted: what it finds cannot be built. Change the design.`;
    return { ...problem, message, range: codeRange };
  }
  const near = nearest(code, acceptableCodes());
  const fixes: Fix[] = near ? [{ title: `Change to \`${near}\``, range: codeRange, text: near }] : [];
  const hint = near ? `did you mean \`${near}\`?` : 'an invalid design, and what is no check, cannot be.';
  return { ...problem, message: `\`${clip(code)}\` is nothing that can be accepted: ${hint}`, range: codeRange, fixes };
}

function removal(range: TextRange): Fix {
  return { title: 'Remove the acceptance', range, text: '' };
}

/** The first part of a comment line that would accept a problem on the line of an offset, and where it goes: above. */
export function acceptanceFix(text: string, { code, range }: Problem): Fix {
  const at = lineStart(text, range.start);
  const indent = text.slice(at, lineAt(text, range.start).start);
  const blank = indent.trim() === '' ? indent : '';
  return {
    title: `Accept ${code}: write the reason behind it`,
    range: { start: at, end: at },
    text: `${blank}# accept ${code}: \n`,
  };
}
