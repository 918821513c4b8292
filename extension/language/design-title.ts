import type { ReadDesign } from '../core/design/read.ts';

/** The design's own title, if it has one. */
export function titleOf(design: ReadDesign): string | undefined {
  const title = design.values.title?.trim();
  return title === '' ? undefined : title;
}
