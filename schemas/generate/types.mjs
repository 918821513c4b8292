// TypeScript types of a design as read: every quantity a Quantity.
import { compile } from 'json-schema-to-typescript';

const BANNER = `// Generated from schemas/gain-module.schema.json; see schemas/generate.mjs.
import type { Quantity } from '../../quantity/quantity.ts';`;

export async function typesOf(schema) {
  const options = {
    bannerComment: BANNER,
    additionalProperties: false,
    ignoreMinAndMaxItems: true,
    style: { singleQuote: true, printWidth: 120, trailingComma: 'all' },
  };
  return compile(readable(schema, 'GainModuleFile'), 'GainModuleFile', options);
}

/** Rules become types only so far: conditions and free keys are left to the validator. */
function readable(node, name) {
  if (node.$ref !== undefined) return { $ref: node.$ref };
  const { description } = node;
  const doc = description === undefined ? {} : { description };
  if (node['x-dimension'] !== undefined) return { ...doc, tsType: 'Quantity' };
  if (node['x-text']) return { ...doc, type: 'string' };
  if (node.enum !== undefined || node.const !== undefined) return { ...doc, enum: node.enum ?? [node.const] };
  if (node.type === 'array') return { ...doc, type: 'array', items: readable(node.items, name.replace(/s$/, '')) };
  if (node.type !== 'object') return { ...doc, type: node.type };
  const properties = Object.fromEntries(
    Object.entries(node.properties).map(([key, value]) => [key, readable(value, pascal(key))]),
  );
  const $defs = Object.fromEntries(
    Object.entries(node.$defs ?? {}).map(([key, value]) => [key, readable(value, pascal(key))]),
  );
  const rest = node.$defs === undefined ? {} : { $defs };
  const title = name === 'GainModuleFile' || name.endsWith('Range') ? name : `${name}Section`;
  return {
    ...doc,
    title,
    type: 'object',
    additionalProperties: false,
    properties,
    required: node.required ?? [],
    ...rest,
  };
}

function pascal(key) {
  return key.replace(/(?:^|_)(\w)/g, (_, letter) => letter.toUpperCase());
}
