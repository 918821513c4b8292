import type { Findings } from './finding.ts';
import type { SchemaNode } from './schema.ts';
import { nearest } from './suggest.ts';
import type { TreeNode } from './tree.ts';
import { clip, listed, placeName } from './wording.ts';

/** Reports a key that its section doesn't know; returns the absent key that it was most likely meant to be. */
export function reportUnknownKey(
  node: TreeNode,
  name: string,
  schema: SchemaNode | undefined,
  root: SchemaNode,
  findings: Findings,
): string | undefined {
  const child = node.entries?.get(name);
  if (child?.key === undefined || schema?.kind !== 'section') return undefined;
  if (findings.isFull()) {
    findings.add('unknown-key', child.path, child.key, clip(name));
    return undefined;
  }
  const known = Object.keys(schema.keys);
  const free = known.filter((key) => !node.entries?.has(key));
  const what = `\`${clip(name)}\` is not a key of ${node.path === '' ? 'a design' : placeName(node.path)}`;
  const meant = nearest(name, free);
  if (meant !== undefined) {
    const fixes = [{ title: `Change to \`${meant}\``, range: child.key, text: meant }];
    findings.add('unknown-key', child.path, child.key, `${what}; did you mean \`${meant}\`?`, { fixes });
    return meant;
  }
  const home = homeOf(name, root, '');
  const present = nearest(name, known);
  let advice = `it can have ${listed(free.length > 0 ? free : known)}`;
  if (home !== undefined) advice = `it belongs in ${placeName(home)}`;
  else if (present !== undefined) advice = `\`${present}\` is, and stands there already`;
  findings.add('unknown-key', child.path, child.key, `${what}; ${advice}.`);
  return undefined;
}

/** The section that has a key of this name. */
function homeOf(name: string, schema: SchemaNode, path: string): string | undefined {
  if (schema.kind !== 'section') return undefined;
  if (path !== '' && Object.hasOwn(schema.keys, name)) return path;
  for (const [key, child] of Object.entries(schema.keys)) {
    const inner = child.kind === 'list' ? child.item : child;
    const found = homeOf(name, inner, path === '' ? key : `${path}.${key}`);
    if (found !== undefined) return found;
  }
  return undefined;
}
