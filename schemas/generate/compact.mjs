// The schema as a table for reading, hovers and completion: references resolved, bounds in SI.
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

const LIMITS = { 'x-above': 'above', 'x-at-least': 'at least', 'x-below': 'below', 'x-at-most': 'at most' };

export async function compactSchema(schema) {
  const readQuantity = await loadReader();
  const tree = compact(schema, schema, '', readQuantity);
  const conditions = {};
  collectConditions(schema, '#', undefined, conditions);
  return `// Generated from schemas/gain-module.schema.json; see schemas/generate.mjs.
import type { Condition, SectionSchema } from '../schema.ts';

export const GAIN_MODULE_SCHEMA: SectionSchema = ${JSON.stringify(tree, null, 1)};

/** By JSON pointer into the schema. */
export const CONDITIONS: Readonly<Record<string, Condition>> = ${JSON.stringify(conditions, null, 1)};
`;
}

function compact(node, root, path, readQuantity) {
  if (node.$ref !== undefined) {
    const { $ref, ...over } = node;
    return compact({ ...root.$defs[$ref.replace('#/$defs/', '')], ...over }, root, path, readQuantity);
  }
  const common = {
    description: node.description,
    ...(node['x-default'] === undefined ? {} : { default: node['x-default'] }),
    ...(node.examples === undefined ? {} : { examples: node.examples.map(String) }),
  };
  if (common.description === undefined) throw new Error(`${path}: no description`);
  const inner = (child, key) => compact(child, root, path === '' ? key : `${path}.${key}`, readQuantity);
  if (node['x-dimension'] !== undefined) return { kind: 'quantity', ...common, ...quantity(node, path, readQuantity) };
  if (node['x-text']) return { kind: 'text', ...common };
  if (node.enum !== undefined || node.const !== undefined) {
    return { kind: 'choice', ...common, allowed: node.enum ?? [node.const] };
  }
  if (node.type === 'integer') return { kind: 'count', ...common, least: node.minimum, most: node.maximum };
  if (node.type === 'array') return { kind: 'list', ...common, item: inner(node.items, '[]') };
  const keys = Object.fromEntries(Object.entries(node.properties).map(([key, value]) => [key, inner(value, key)]));
  const order = node['x-order'];
  const ordered =
    order === undefined
      ? {}
      : { order: { lower: order.lower, upper: order.upper, strict: order.strict, because: order['x-because'] } };
  return { kind: 'section', ...common, keys, required: node.required ?? [], ...ordered };
}

function quantity(node, path, readQuantity) {
  const dimension = node['x-dimension'];
  const bound = (text) => {
    const read = readQuantity(text, dimension);
    if (!('quantity' in read)) throw new Error(`${path}: ${text}: ${read.problem.message}`);
    return { text, value: read.quantity.value };
  };
  const limits = Object.entries(LIMITS)
    .filter(([keyword]) => node[keyword] !== undefined)
    .map(([keyword, name]) => ({ bound: name, ...bound(node[keyword]), ...reason(node['x-why']?.[keyword.slice(2)]) }));
  for (const key of Object.keys(node['x-why'] ?? {})) {
    if (node[`x-${key}`] === undefined) throw new Error(`${path}: x-why explains ${key}, which sets no limit`);
  }
  // An upper limit on every quantity is what keeps the arithmetic behind it finite.
  if (!limits.some((limit) => limit.bound === 'below' || limit.bound === 'at most')) {
    throw new Error(`${path}: no upper limit`);
  }
  for (const example of node.examples) bound(example);
  const [low, high] = node['x-usual'] ?? [];
  return {
    dimension,
    limits,
    ...(low === undefined ? {} : { usual: { low: bound(low), high: bound(high), ...reason(node['x-unusual']) } }),
  };
}

function reason(why) {
  return why === undefined ? {} : { why };
}

/** Where a rule stands under `if`, the key that the `if` looks at is the one to blame. */
function collectConditions(node, pointer, blame, found) {
  if (typeof node !== 'object' || node === null) return;
  const blamed = node.if?.properties === undefined ? blame : Object.keys(node.if.properties)[0];
  if (typeof node['x-because'] === 'string' && !pointer.endsWith('/x-order')) {
    found[pointer] = { because: node['x-because'], ...(blame === undefined ? {} : { blame }) };
  }
  for (const [key, value] of Object.entries(node)) {
    const token = key.replaceAll('~', '~0').replaceAll('/', '~1');
    collectConditions(value, `${pointer}/${token}`, blamed, found);
  }
}

async function loadReader() {
  const bundle = await build({
    entryPoints: [fileURLToPath(new URL('../../extension/core/quantity/quantity.ts', import.meta.url))],
    bundle: true,
    format: 'esm',
    write: false,
    logLevel: 'error',
  });
  const { readQuantity } = await import(
    `data:text/javascript;base64,${Buffer.from(bundle.outputFiles[0].contents).toString('base64')}`
  );
  return readQuantity;
}
