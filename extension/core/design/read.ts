import type { Quantity } from '../quantity/quantity.ts';
import type { Problem, TextRange } from '../report/problem.ts';
import { buildTree } from './build-tree.ts';
import { createFindings, type Findings } from './finding.ts';
import type { GainModuleFile } from './generated/gain-module.ts';
import { GAIN_MODULE_SCHEMA } from './generated/schema.ts';
import { lineAt, withoutNote } from './lines.ts';
import { readValue } from './read-values.ts';
import { keySchema, type SchemaNode } from './schema.ts';
import { checkStructure } from './structure.ts';
import { indexByPath, nodeAt, parentPath, type TreeNode } from './tree.ts';
import { parseYaml } from './yaml.ts';

/** Any part of it may be absent; a list keeps an empty entry for what can't be read. */
export type Draft<T> = T extends Quantity | string | number
  ? T
  : T extends readonly (infer Item)[]
    ? readonly Draft<Item>[]
    : { readonly [Key in keyof T]?: Draft<NonNullable<T[Key]>> };

/** What a design says, as far as its text can be read, and where. */
export interface ReadDesign {
  /** Only what is usable by itself: of the right kind and within its limits. */
  readonly values: Draft<GainModuleFile>;
  /** In the order of the text. */
  readonly problems: readonly Problem[];
  readonly root: TreeNode | undefined;
  /** Of the value at a path, else the key of the nearest section around it, else the first line. */
  rangeOf(path: string): TextRange;
  /** Of the key at a path, with the same fallbacks. */
  keyRangeOf(path: string): TextRange;
  /** The deepest node whose key or value holds an offset. */
  nodeAt(offset: number): TreeNode | undefined;
  /** What the schema says of a path, whether or not the text has it. */
  schemaOf(path: string): SchemaNode | undefined;
}

/** Reads a design file. Whatever the text, the result is a value: what is wrong is among its problems. */
export function readDesign(text: string): ReadDesign {
  const findings = createFindings();
  const parsed = parseYaml(text, findings);
  const root = parsed && buildTree(text, parsed.document, findings);
  const values = root === undefined ? {} : readRoot(text, root, parsed?.partial ?? false, findings);
  let index: ReadonlyMap<string, TreeNode> | undefined;
  const find = (path: string): TreeNode | undefined => {
    index ??= indexByPath(root);
    return index.get(path);
  };
  const around = (path: string): TextRange => {
    for (let outer = parentPath(path); outer !== undefined && outer !== ''; outer = parentPath(outer)) {
      const node = find(outer);
      if (node !== undefined) return node.key ?? node.value;
    }
    return withoutNote(text, lineAt(text, 0));
  };
  return {
    values,
    problems: findings.list(),
    root,
    rangeOf: (path) => (path === '' ? undefined : find(path)?.value) ?? around(path),
    keyRangeOf: (path) => {
      const node = path === '' ? undefined : find(path);
      return node?.key ?? node?.value ?? around(path);
    },
    nodeAt: (offset) => nodeAt(root, offset),
    schemaOf,
  };
}

function readRoot(text: string, root: TreeNode, partial: boolean, findings: Findings): Draft<GainModuleFile> {
  checkStructure(text, root, GAIN_MODULE_SCHEMA, partial, findings);
  const values = readValue(root, GAIN_MODULE_SCHEMA, findings) ?? {};
  // The type is generated from the schema that guided the reading.
  return values as Draft<GainModuleFile>;
}

function schemaOf(path: string): SchemaNode | undefined {
  let schema: SchemaNode | undefined = GAIN_MODULE_SCHEMA;
  for (const token of path === '' ? [] : path.split(/\.|(?=\[)/)) {
    if (schema?.kind === 'list') schema = token.startsWith('[') ? schema.item : undefined;
    else schema = keySchema(schema, token);
  }
  return schema;
}
