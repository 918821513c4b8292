import type { Uri } from 'vscode';

/** The line (from 1) of each section of a Markdown text: a heading that is or opens with a code, or an anchor. */
export function anchorLines(markdown: string): ReadonlyMap<string, number> {
  const lines = new Map<string, number>();
  markdown.split(/\r?\n/).forEach((line, index) => {
    const heading = /^#{1,6}\s+`?([a-z0-9]+(?:-[a-z0-9]+)*)`?\s*(?:$|[:—–])/.exec(line)?.[1];
    const anchor = heading ?? /<a (?:id|name)="([a-z0-9-]+)">/.exec(line)?.[1];
    if (anchor !== undefined && !lines.has(anchor)) lines.set(anchor, index + 1);
  });
  return lines;
}

/** The editor opens a file's link at the line that the fragment names; it knows no Markdown anchors. */
export function linkTo(file: Uri, line: number | undefined): Uri {
  return line === undefined ? file : file.with({ fragment: `L${line}` });
}
