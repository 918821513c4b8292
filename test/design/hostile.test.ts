import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { MAX_EXPANDED, MAX_NODES } from '../../extension/core/design/build-tree.ts';
import { READING_CODES } from '../../extension/core/design/codes.ts';
import { MAX_PROBLEMS } from '../../extension/core/design/finding.ts';
import { readDesign } from '../../extension/core/design/read.ts';
import { MAX_DEPTH } from '../../extension/core/design/tokens.ts';
import type { TreeNode } from '../../extension/core/design/tree.ts';

const demo = readFileSync(new URL('../designs/good/hail_lidar.gainmodule.yaml', import.meta.url), 'utf8');
const codes = new Set<string>(READING_CODES.map(({ code }) => code));

/** Reads a text, holds the result to what every result must be, and returns the codes of its problems. */
function read(text: string): readonly string[] {
  const { problems, root } = readDesign(text);
  expect(problems.length).toBeLessThanOrEqual(MAX_PROBLEMS + 1);
  let last = 0;
  for (const { code, range, message, fixes } of problems) {
    expect(codes).toContain(code);
    expect(range.start).toBeGreaterThanOrEqual(last);
    expect(range.end).toBeGreaterThanOrEqual(range.start);
    expect(range.end).toBeLessThanOrEqual(text.length);
    expect(message.length).toBeLessThan(600);
    for (const fix of fixes ?? []) expect(fix.range.end).toBeLessThanOrEqual(text.length);
    last = range.start;
  }
  const { nodes, depth } = size(root);
  expect(nodes).toBeLessThanOrEqual(MAX_NODES + MAX_EXPANDED);
  expect(depth).toBeLessThanOrEqual(MAX_DEPTH + 2);
  return problems.map(({ code }) => code);
}

function size(node: TreeNode | undefined): { nodes: number; depth: number } {
  let nodes = 0;
  let depth = 0;
  for (const child of node?.entries?.values() ?? node?.items ?? []) {
    const inner = size(child);
    nodes += inner.nodes;
    depth = Math.max(depth, inner.depth);
  }
  return { nodes: nodes + 1, depth: depth + 1 };
}

function noise(length: number, alphabet: string): string {
  let state = 7;
  const characters: string[] = [];
  for (let index = 0; index < length; index++) {
    state = (Math.imul(state, 1103515245) + 12345) & 0x7fffffff;
    characters.push(alphabet.charAt((state >> 8) % alphabet.length));
  }
  return characters.join('');
}

const bytes = Array.from({ length: 256 }, (_, code) => String.fromCharCode(code)).join('');
const marks = 'ab1 :-[]{},&*!|>\'"%@`#?~.\n';

describe('texts that are no design', () => {
  test.each([
    ['nothing', '', 'empty-file'],
    ['blanks', ' \n\t\n  ', 'empty-file'],
    ['comments', '# one\n# two\n', 'empty-file'],
    ['a marker', '---\n# nothing\n...\n', 'empty-file'],
    ['a directive', '%YAML 1.2\n---\n', 'empty-file'],
    ['a byte-order mark', '\ufeff', 'empty-file'],
    ['zero bytes', `format: 1\n\0\0`, 'not-text'],
    ['a picture', '\ufffdPNG\r\n\u001a\n', 'not-text'],
    ['a null', '~', 'missing-value'],
    ['a word', 'laser', 'wrong-type'],
    ['ten megabytes', 'a: b\n'.repeat(2_000_000), 'file-too-large'],
  ])('%s: one clear problem', (_, text, code) => {
    expect(read(text)).toEqual([code]);
  });

  test('the odd character of a binary file is where the problem stands', () => {
    expect(readDesign('format: 1\n\0').problems[0]?.range).toEqual({ start: 10, end: 11 });
  });
});

describe('texts that would cost too much', () => {
  test('aliases that multiply', () => {
    const lines = ['x-a: &a [1, 1, 1, 1, 1, 1, 1, 1, 1]'];
    for (const [from, to] of ['ab', 'bc', 'cd', 'de', 'ef', 'fg', 'gh', 'hi'].map((pair) => [...pair])) {
      lines.push(`x-${to}: &${to} [${Array.from({ length: 9 }, () => `*${from}`).join(', ')}]`);
    }
    expect(read(`${demo}${lines.join('\n')}\n`)).toEqual(['alias-expansion']);
  });

  test('merges that multiply, and chains of them', () => {
    const many = Array.from({ length: 3000 }, (_, index) => `x-m${index}: { <<: [ *a, *a, *a ] }`).join('\n');
    expect(read(`${demo}x-a: &a { k: 1 }\n${many}\n`)).toContain('alias-expansion');
    const chain = Array.from({ length: 3000 }, (_, n) => `x-${n + 1}: &a${n + 1} { <<: *a${n}, k${n}: 1 }`).join('\n');
    expect(read(`${demo}x-0: &a0 { k: 1 }\n${chain}\n`)).toContain('alias-expansion');
  });

  test('an alias inside itself', () => {
    expect(read('a: &a { b: *a, <<: *a }\nc: &c [ *c ]\n')).toContain('bad-alias');
  });

  // Opening braces once ended the whole process, not only the call: the composer behind `yaml` is recursive.
  test.each(['[', '{', '- ', '? ', ': ', 'a: ', '{"a":', '- - ? '])('%s nested 100,000 times', (mark) => {
    const found = read(mark.repeat(100_000));
    expect(found).toContain('nested-too-deep');
    expect(read(mark.repeat(1000))).toContain('nested-too-deep');
  });

  test('nesting by indentation', () => {
    const text = Array.from({ length: 1000 }, (_, depth) => `${' '.repeat(depth)}a:\n`).join('');
    expect(read(text)).toContain('nested-too-deep');
  });

  test('40,000 duplicate keys', () => {
    const found = read('a: 1\n'.repeat(40_000));
    expect(found).toContain('duplicate-key');
    expect(found.at(-1)).toBe('too-many-problems');
  });

  test('15,000 unknown keys, and values by the ten thousand', () => {
    const keys = Array.from({ length: 15_000 }, (_, index) => `u${index}: 1`).join(', ');
    expect(read(`gain_medium: { ${keys} }`)).toContain('file-too-large');
    expect(read(`surfaces: [ ${'[ 1 ], '.repeat(30_000)} ]`)).toContain('file-too-large');
  });

  test('errors by the hundred thousand', () => {
    for (const part of ['\\q', ']', ',', '! ', '&a ', '@\n', ': 1\n', '%x\n', '"\n']) {
      expect(read(`a: "${part.repeat(150_000)}"`).length).toBeGreaterThan(0);
      expect(read(part.repeat(150_000)).length).toBeGreaterThan(0);
    }
  });

  test('one endless key, value or line', () => {
    expect(read(`${'k'.repeat(1_000_000)}:\n${'  a: 1\n'.repeat(20)}`)).toContain('yaml-syntax');
    expect(read(`gain_medium: { length: "${'1'.repeat(1_000_000)} mm" }`)).toContain('not-a-quantity');
    expect(read(`title: ${'x'.repeat(1_900_000)}`)).toContain('missing-key');
  });
});

describe('noise', () => {
  test('a megabyte of bytes, and of YAML’s own marks', () => {
    expect(read(noise(1_000_000, bytes))).toEqual(['not-text']);
    expect(read(noise(1_000_000, marks)).length).toBeGreaterThan(0);
  });

  test('any string gives problems, or is a design', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...marks), maxLength: 80 }), (text) => {
        expect(read(text).length).toBeGreaterThan(0);
      }),
      { numRuns: 3000, seed: 4 },
    );
  });

  test('a design with pieces of its text moved, lost and spoilt', () => {
    const piece = fc.tuple(
      fc.nat(demo.length),
      fc.nat(30),
      fc.oneof(fc.string({ maxLength: 5 }), fc.constantFrom(...marks)),
    );
    fc.assert(
      fc.property(fc.array(piece, { minLength: 1, maxLength: 4 }), (pieces) => {
        const text = pieces.reduce((now, [at, length, by]) => now.slice(0, at) + by + now.slice(at + length), demo);
        read(text);
      }),
      { numRuns: 1500, seed: 5 },
    );
  });
});
