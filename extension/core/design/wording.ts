import { DIMENSIONS } from '../quantity/dimension.ts';
import type { SchemaNode } from './schema.ts';
import type { TreeNode } from './tree.ts';

const LONGEST_EXCERPT = 40;

/** Enough of a text to recognise it, on one line and without backquotes. */
export function clip(text: string): string {
  const line = text.slice(0, LONGEST_EXCERPT + 1).replace(/[\p{Cc}\p{Cs}\p{Zl}\p{Zp}`]/gu, ' ');
  return line.length > LONGEST_EXCERPT ? `${line.slice(0, LONGEST_EXCERPT - 1)}…` : line;
}

/** A place by its path, as a message names it. */
export function placeName(path: string): string {
  return path === '' ? 'The design' : `\`${clip(path)}\``;
}

export function listed(words: readonly string[], conjunction: 'and' | 'or' = 'or'): string {
  const quoted = words.map((word) => `\`${word}\``);
  return quoted.length < 2 ? quoted.join() : `${quoted.slice(0, -1).join(', ')} ${conjunction} ${quoted.at(-1)}`;
}

/** A key as it might be written: `duration: 200 us`. */
export function exampleOf(key: string, schema: SchemaNode | undefined): string {
  const value = schema?.examples?.[0] ?? (schema?.kind === 'choice' ? String(schema.allowed[0]) : undefined);
  return value === undefined ? `\`${key}:\` with its keys` : `\`${key}\`, for example \`${key}: ${value}\``;
}

/** What a value that is missing or of the wrong kind should have been. */
export function describeWrongType(node: TreeNode, schema: SchemaNode, required: boolean): string {
  const name = placeName(node.path);
  if (node.kind === 'null')
    return `${name} has no value. Give ${wanted(schema)}${required ? '' : ', or remove the key'}.`;
  const found = node.kind === 'map' ? 'a section' : node.kind === 'list' ? 'a list' : `\`${clip(node.text ?? '')}\``;
  const quoted = schema.kind === 'count' && typeof node.data === 'string' && /^\d+$/.test(node.data);
  return `${name} takes ${wanted(schema)}, not ${found}${quoted ? ' in quotes' : ''}.`;
}

function wanted(schema: SchemaNode): string {
  const example = schema.examples?.[0];
  switch (schema.kind) {
    case 'section':
      return `a section with ${listed(schema.required.length > 0 ? schema.required : Object.keys(schema.keys), 'and')}`;
    case 'list':
      return 'a list, one `-` for each item';
    case 'quantity': {
      const { noun } = DIMENSIONS[schema.dimension];
      return example === undefined ? noun : `${noun} such as \`${example}\``;
    }
    case 'choice':
      return listed(schema.allowed.map(String));
    case 'text':
      return example === undefined ? 'text' : `text such as \`${example}\``;
    case 'count':
      return `a whole number such as \`${example ?? schema.least}\``;
  }
}
