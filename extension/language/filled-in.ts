import type { Origin } from '../core/design/origins.ts';
import { parentPath } from '../core/design/tree.ts';
import { escaped } from './markdown.ts';
import { raised } from './show.ts';

/** The figures of a section that the file does not give, each with what stands in its place, as a Markdown list. */
export function filledIn(origins: ReadonlyMap<string, Origin>, section: string): readonly string[] {
  return [...origins].flatMap(([path, origin]) =>
    parentPath(path) === section ? [`- \`${path.slice(section.length + 1)}\`: ${explained(origin)}`] : [],
  );
}

/** A default in words; a figure of the property table with its row, its source and how far to trust it. */
function explained({ kind, note, figure }: Origin): string {
  if (kind === 'default' || figure === undefined) return `${escaped(note)} (default)`;
  const trust = figure.fromMemory ? ', from memory' : '';
  return `${raised(figure.text)} (property table, ${escaped(note)}; ${escaped(figure.source)}${trust})`;
}
