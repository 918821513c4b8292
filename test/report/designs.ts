import { readdirSync, readFileSync } from 'node:fs';

const root = new URL('../designs/', import.meta.url);

/** Every design under test/designs, by its path there, and what else a report has to stand. */
export const DESIGNS: readonly (readonly [name: string, text: string])[] = [
  ...readdirSync(root, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.gainmodule.yaml'))
    .sort()
    .map((name) => [name, readFileSync(new URL(name, root), 'utf8')] as const),
  ['empty', ''],
  ['noise', '\u0000\u0001 : [ {'],
];

export function design(name: string): string {
  return readFileSync(new URL(name, root), 'utf8');
}

export const demo = readFileSync(new URL('../../extension/demo/hail_lidar.gainmodule.yaml', import.meta.url), 'utf8');
