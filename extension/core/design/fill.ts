import type { Fix } from '../report/problem.ts';
import { keySchema, type SchemaNode, type SectionSchema } from './schema.ts';
import { sectionRules } from './section-rules.ts';
import type { TreeNode } from './tree.ts';

/** A key with its value as plain data, examples of the schema throughout. */
type Example = string | number | { readonly [key: string]: Example };

/** Writes a key that a section lacks, with the schema's examples for values: the author replaces them. */
export function fillingFix(text: string, section: TreeNode, key: string, schema: SchemaNode | undefined): Fix[] {
  const inner = keySchema(schema, key);
  const example = inner && exampleFor(section.path, key, inner);
  const place = example === undefined ? undefined : placeIn(text, section);
  if (example === undefined || place === undefined) return [];
  const { offset, indent } = place;
  const written =
    indent === undefined
      ? `${place.first ? ' ' : ', '}${key}: ${inFlow(example)}`
      : `\n${lines(key, example, indent).join('\n')}`;
  return [{ title: `Add \`${key}\` with example values`, range: { start: offset, end: offset }, text: written }];
}

/** Writes the schema's example behind a key that has no value. */
export function valueFix(text: string, node: TreeNode, schema: SchemaNode): Fix[] {
  const example = schema.kind === 'section' || schema.kind === 'list' ? undefined : leaf(schema);
  const colon = node.key === undefined ? -1 : text.indexOf(':', node.key.end);
  if (example === undefined || colon < 0 || text.slice(node.key?.end, colon).trim() !== '') return [];
  return [{ title: `Write \`${example}\``, range: { start: colon + 1, end: colon + 1 }, text: ` ${example}` }];
}

/** The end of a section's last entry, and the indentation of its keys (none in flow style); undefined where that can't be told. */
function placeIn(text: string, { entries, written }: TreeNode) {
  const own = [...(entries?.values() ?? [])].filter(({ merged, key }) => !merged && key !== undefined);
  const last = own.at(-1);
  if (text[written.start] === '{') {
    if (last === undefined) return { offset: written.start + 1, indent: undefined, first: true };
    return { offset: trimmedEnd(text, last), indent: undefined, first: false };
  }
  const [start] = own.map(({ key }) => key?.start ?? 0);
  if (last === undefined || start === undefined) return undefined;
  const before = text.slice(text.lastIndexOf('\n', start - 1) + 1, start);
  const end = text.indexOf('\n', trimmedEnd(text, last));
  const offset = end < 0 ? text.length : text[end - 1] === '\r' ? end - 1 : end;
  // In a list the first key stands behind the dash.
  return { offset, indent: before.replace(/[^ ]/g, ' '), first: false };
}

function trimmedEnd(text: string, { extent }: TreeNode): number {
  return extent.start + text.slice(extent.start, extent.end).trimEnd().length;
}

function lines(key: string, example: Example, indent: string): string[] {
  if (typeof example !== 'object' || isShort(example)) return [`${indent}${key}: ${inFlow(example)}`];
  return [`${indent}${key}:`, ...Object.entries(example).flatMap(([name, value]) => lines(name, value, `${indent}  `))];
}

/** A section of two or three plain values reads best on one line. */
function isShort(example: { readonly [key: string]: Example }): boolean {
  const values = Object.values(example);
  return values.length <= 3 && values.every((value) => typeof value !== 'object');
}

function inFlow(example: Example): string {
  if (typeof example !== 'object') return String(example);
  return `{ ${Object.entries(example)
    .map(([key, value]) => `${key}: ${inFlow(value)}`)
    .join(', ')} }`;
}

function leaf(schema: SchemaNode): string | number | undefined {
  if (schema.kind === 'choice') return schema.allowed[0];
  return schema.examples?.[0];
}

/** Required keys first; what a condition then asks for is added until the validator asks for no more of this section. */
function exampleFor(section: string, key: string, schema: SchemaNode): Example | undefined {
  if (schema.kind === 'list') return undefined;
  if (schema.kind !== 'section') return leaf(schema);
  const path = section === '' ? key : `${section}.${key}`;
  const keys = [...schema.required];
  for (let round = 0; round < 4; round++) {
    const example = sectionExample(schema, keys);
    const more = sectionRules(path, example).missing.filter((name) => !keys.includes(name));
    if (more.length === 0) return example;
    keys.push(...more);
  }
  return undefined;
}

/** A key with an example for its value, as lines below one another at an indentation, or on one line in flow style. */
export function exampleText(
  section: string,
  key: string,
  schema: SchemaNode,
  indent: string | undefined,
): string | undefined {
  const example = exampleFor(section, key, schema);
  if (example === undefined) return undefined;
  return indent === undefined ? `${key}: ${inFlow(example)}` : lines(key, example, indent).join('\n').trimStart();
}

function sectionExample(schema: SectionSchema, keys: readonly string[]): { readonly [key: string]: Example } {
  const order = Object.keys(schema.keys).filter((key) => keys.includes(key));
  return Object.fromEntries(
    order.flatMap((key) => {
      const inner = schema.keys[key];
      const value = inner?.kind === 'section' ? sectionExample(inner, inner.required) : inner && leaf(inner);
      return value === undefined ? [] : [[key, value]];
    }),
  );
}
