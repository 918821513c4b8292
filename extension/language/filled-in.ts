import type { Origin } from '../core/design/origins.ts';
import { parentPath } from '../core/design/tree.ts';
import { FIGURE_DIMENSIONS } from '../core/physics/materials.ts';
import { escaped } from './markdown.ts';
import { raised } from './show.ts';
import { isFigure, spreadOf } from './table-help.ts';

/** The figures of a section that the file does not give, each with what stands in its place, as a Markdown list. */
export function filledIn(origins: ReadonlyMap<string, Origin>, section: string): readonly string[] {
  return [...origins].flatMap(([path, origin]) =>
    parentPath(path) === section ? [line(path.slice(section.length + 1), origin)] : [],
  );
}

/** A default in words; a figure of the property table with its row, its source, its spread and how far to trust it. */
function line(key: string, { kind, note, figure }: Origin): string {
  if (kind === 'default' || figure === undefined) return `- \`${key}\`: ${escaped(note)} (default)`;
  const trust = figure.fromMemory ? ', from memory' : '';
  const spread = isFigure(key) ? spreadOf(figure, FIGURE_DIMENSIONS[key]) : '';
  return `- \`${key}\`: ${raised(figure.text)} (property table, ${escaped(note)}; ${escaped(figure.source)}${trust})${spread}`;
}
