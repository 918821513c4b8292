import type { Analysis } from '../core/analyse.ts';

/** The part of an open document that analysis needs. */
export interface VersionedText {
  readonly uri: string;
  readonly version: number;
  getText(): string;
}

/** What is known of one version of a document; `failure` is a fault of ours, never of the design. */
export type Analysed<T extends VersionedText> =
  | { readonly document: T; readonly version: number; readonly analysis: Analysis }
  | { readonly document: T; readonly version: number; readonly failure: string };

export interface Analyses<T extends VersionedText> {
  /** The analysis of the document as it stands; undefined when it is not open. */
  of(uri: string): Analysed<T> | undefined;
  forget(uri: string): void;
}

/** The only cache of results: one entry a document, replaced as soon as its version has moved on. */
export function createAnalyses<T extends VersionedText>(
  documents: { get(uri: string): T | undefined },
  analyse: (text: string) => Analysis,
): Analyses<T> {
  const known = new Map<string, Analysed<T>>();
  return {
    of(uri) {
      const document = documents.get(uri);
      if (document === undefined) return undefined;
      const last = known.get(uri);
      if (last?.version === document.version && last.document === document) return last;
      const analysed = attempt(document, analyse);
      known.set(uri, analysed);
      return analysed;
    },
    forget: (uri) => void known.delete(uri),
  };
}

function attempt<T extends VersionedText>(document: T, analyse: (text: string) => Analysis): Analysed<T> {
  const { version } = document;
  try {
    return { document, version, analysis: analyse(document.getText()) };
  } catch (error) {
    return { document, version, failure: error instanceof Error ? error.message : String(error) };
  }
}
