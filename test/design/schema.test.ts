import { spawnSync } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { Ajv2020 } from 'ajv/dist/2020.js';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import { GAIN_MODULE_SCHEMA } from '../../extension/core/design/generated/schema.ts';
import { readDesign } from '../../extension/core/design/read.ts';
import type { SchemaNode } from '../../extension/core/design/schema.ts';
import type { TreeNode } from '../../extension/core/design/tree.ts';
import schema from '../../schemas/gain-module.schema.json' with { type: 'json' };

const folder = new URL('../designs/good/', import.meta.url);
const texts = readdirSync(folder).map((name) => readFileSync(new URL(name, folder), 'utf8'));

test('what is generated from the schema is what is checked in', () => {
  const script = fileURLToPath(new URL('../../schemas/generate.mjs', import.meta.url));
  const run = spawnSync(process.execPath, [script, '--check'], { encoding: 'utf8' });
  expect(run.stderr).toBe('');
  expect(run.status).toBe(0);
});

describe('the table of keys', () => {
  const keys = [...walk(GAIN_MODULE_SCHEMA, '')];

  test('every key is used in one of the good designs', () => {
    const used = new Set(texts.flatMap((text) => paths(readDesign(text).root)));
    expect(keys.map(([path]) => path).filter((path) => !used.has(path))).toEqual([]);
  });

  test('every quantity is bounded above, and its usual range lies within its limits', () => {
    for (const [path, node] of keys) {
      expect(node.description, path).toMatch(/\.$/);
      if (node.kind !== 'quantity') continue;
      const top = Math.min(...node.limits.filter(({ bound }) => /below|most/.test(bound)).map(({ value }) => value));
      const bottom = Math.max(
        ...node.limits.filter(({ bound }) => /above|least/.test(bound)).map(({ value }) => value),
      );
      expect(top, path).toBeLessThan(1e35);
      expect(bottom, path).toBeGreaterThanOrEqual(0);
      if (node.usual === undefined) continue;
      expect(node.usual.low.value, path).toBeGreaterThanOrEqual(bottom);
      expect(node.usual.high.value, path).toBeGreaterThan(node.usual.low.value);
      expect(node.usual.high.value, path).toBeLessThanOrEqual(top);
    }
  });
});

function* walk(node: SchemaNode, path: string): Generator<readonly [string, SchemaNode]> {
  if (path !== '') yield [path, node];
  if (node.kind === 'list') yield* walk(node.item, `${path}[]`);
  if (node.kind !== 'section') return;
  for (const [key, inner] of Object.entries(node.keys)) yield* walk(inner, path === '' ? key : `${path}.${key}`);
}

function paths(node: TreeNode | undefined): readonly string[] {
  if (node === undefined) return [];
  const inner = [...(node.entries?.values() ?? node.items ?? [])].flatMap((child) => paths(child));
  return [node.path.replace(/\[\d+\]/g, '[]'), ...inner];
}

describe('the verdict is the schema’s', () => {
  const validate = new Ajv2020({ strict: false, allErrors: false }).compile(schema);
  const designs: readonly unknown[] = texts.map((text) => parse(text, { version: '1.2', merge: true }));
  const words = [...new Set([...walk(GAIN_MODULE_SCHEMA, '')].map(([path]) => path.replace(/.*[.\]]/, '')))].filter(
    Boolean,
  );
  const values = [
    null,
    true,
    3,
    0,
    2.5,
    '',
    'pulsed',
    'continuous',
    'gaussian',
    'none',
    'saturable_absorber',
    '5 mm',
    {},
    [],
  ];
  const edit = fc.record({
    where: fc.nat(),
    what: fc.constantFrom('delete', 'rename', 'replace', 'add'),
    key: fc.oneof(fc.constantFrom(...words), fc.constantFrom('powr', 'x-note', 'length ', '__proto__')),
    value: fc.constantFrom(...values),
  });
  const structural = new Set([
    'unknown-key',
    'missing-key',
    'excluded-key',
    'missing-value',
    'wrong-type',
    'not-allowed',
  ]);

  test('for designs changed at random', () => {
    const verdicts = { valid: 0, invalid: 0 };
    fc.assert(
      fc.property(fc.constantFrom(...designs), fc.array(edit, { maxLength: 3 }), (original, edits) => {
        const design = structuredClone(original);
        for (const one of edits) apply(design, one);
        const { problems } = readDesign(JSON.stringify(design));
        const blamed = problems.filter(
          ({ code, path }) => structural.has(code) || (code === 'out-of-range' && path.endsWith('.count')),
        );
        const valid = validate(design);
        verdicts[valid ? 'valid' : 'invalid']++;
        expect(blamed.length === 0, JSON.stringify({ problems, errors: validate.errors })).toBe(valid);
      }),
      { numRuns: 3000, seed: 20, endOnFailure: true },
    );
    expect(verdicts.valid).toBeGreaterThan(300);
    expect(verdicts.invalid).toBeGreaterThan(1000);
  });
});

interface Edit {
  readonly where: number;
  readonly what: string;
  readonly key: string;
  readonly value: unknown;
}

/** Changes one entry of one section, both picked by `where`. */
function apply(design: unknown, { where, what, key, value }: Edit): void {
  const sections = [...maps(design)];
  const section = sections[where % sections.length];
  const names = Object.keys(section ?? {});
  const name = names[(where >> 8) % names.length];
  if (section === undefined) return;
  const copy: unknown = structuredClone(value);
  const put = (at: string, what: unknown): void => {
    Object.defineProperty(section, at, { value: what, enumerable: true, configurable: true, writable: true });
  };
  if (what === 'add' || name === undefined) {
    put(key, copy);
  } else if (what === 'replace') {
    put(name, copy);
  } else {
    const old = section[name];
    delete section[name];
    if (what === 'rename') put(key, old);
  }
}

function* maps(value: unknown): Generator<Record<string, unknown>> {
  if (typeof value !== 'object' || value === null) return;
  if (!Array.isArray(value)) yield value as Record<string, unknown>;
  for (const inner of Object.values(value)) yield* maps(inner);
}
