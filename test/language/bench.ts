import { readFileSync } from 'node:fs';
import type { MarkupContent } from 'vscode-languageserver-protocol';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { analyse } from '../../extension/core/analyse.ts';
import { hover } from '../../extension/language/hover.ts';
import type { Subject } from '../../extension/language/subject.ts';
import { createAnalyses } from '../../extension/server/analyses.ts';

export const transmitter = readFileSync(
  new URL('../host/workspace/transmitter.gainmodule.yaml', import.meta.url),
  'utf8',
);

export interface Bench {
  readonly document: TextDocument;
  /** What every feature is a function of. */
  readonly subject: Subject;
  /** Offset of a piece of text, `by` characters into it. */
  at(text: string, by?: number): number;
}

export function bench(text: string): Bench {
  const document = TextDocument.create('file:///bench/a.gainmodule.yaml', 'gainmodule', 1, text);
  const subject = createAnalyses({ get: () => document }, analyse).of(document.uri);
  if (subject === undefined || 'failure' in subject) throw new Error(subject?.failure ?? 'not open');
  return {
    document,
    subject,
    at(wanted, by = 0) {
      const offset = text.indexOf(wanted);
      if (offset < 0) throw new Error(`no ${wanted}`);
      return offset + by;
    },
  };
}

/** The hover's Markdown and the text that it is about; undefined where there is none. */
export function hoverAt({ subject, document }: Bench, offset: number): { text: string; about: string } | undefined {
  const found = hover(subject, offset);
  if (found?.range === undefined) return undefined;
  const { contents } = found;
  const isMarkup = (value: typeof contents): value is MarkupContent => typeof value === 'object' && 'kind' in value;
  if (!isMarkup(contents)) throw new Error('not Markdown');
  return { text: contents.value, about: document.getText(found.range) };
}
