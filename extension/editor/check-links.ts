import type { Uri } from 'vscode';

/** The line (from 1) of each section of a Markdown text whose heading is, or begins with, a check's code. */
export function anchorLines(markdown: string): ReadonlyMap<string, number> {
  const lines = new Map<string, number>();
  markdown.split(/\r?\n/).forEach((line, index) => {
    const anchor = /^#{1,6}\s+`?([a-z0-9/-]+)`?\s*$/i.exec(line)?.[1];
    if (anchor !== undefined && !lines.has(anchor)) lines.set(anchor, index + 1);
  });
  return lines;
}

/** The editor opens a file's link at the line that the fragment names; it knows no Markdown anchors. */
export function linkTo(file: Uri, line: number | undefined): Uri {
  return line === undefined ? file : file.with({ fragment: `L${line}` });
}
