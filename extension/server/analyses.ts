import type { Position, Range } from 'vscode-languageserver-protocol';
import type { Analysis } from '../core/analyse.ts';
import { createExplorer } from '../core/explore/explorer.ts';
import type { Subject } from '../language/subject.ts';

/** The part of an open document that analysis needs. */
export interface VersionedText {
  readonly uri: string;
  readonly version: number;
  getText(): string;
  positionAt(offset: number): Position;
  offsetAt(position: Position): number;
}

/** A version whose analysis failed: a fault of ours, never of the design. */
export interface Failed {
  readonly uri: string;
  readonly version: number;
  readonly failure: string;
}

export interface Analyses {
  /** The analysis of the document as it stands; undefined when it is not open. */
  of(uri: string): Subject | Failed | undefined;
  forget(uri: string): void;
}

/** The only cache of results: one entry a document, replaced as soon as its version has moved on. */
export function createAnalyses<T extends VersionedText>(
  documents: { get(uri: string): T | undefined },
  analyse: (text: string) => Analysis,
): Analyses {
  const known = new Map<string, { readonly document: T; readonly analysed: Subject | Failed }>();
  return {
    of(uri) {
      const document = documents.get(uri);
      if (document === undefined) return undefined;
      const last = known.get(uri);
      // A document that was closed and opened again may count its versions from 1 again.
      if (last?.document === document && last.analysed.version === document.version) return last.analysed;
      const analysed = attempt(document, analyse);
      known.set(uri, { document, analysed });
      return analysed;
    },
    forget: (uri) => void known.delete(uri),
  };
}

function attempt(document: VersionedText, analyse: (text: string) => Analysis): Subject | Failed {
  const { uri, version } = document;
  try {
    const text = document.getText();
    const analysis = analyse(text);
    return {
      uri,
      version,
      text,
      analysis,
      explorer: createExplorer(analysis),
      // An open document changes in place: places are asked for only while this version is the current one.
      toRange: ({ start, end }): Range => ({ start: document.positionAt(start), end: document.positionAt(end) }),
      offsetAt: (position) => document.offsetAt(position),
    };
  } catch (error) {
    return { uri, version, failure: error instanceof Error ? error.message : String(error) };
  }
}
