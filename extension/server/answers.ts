import { type CancellationToken, LSPErrorCodes, ResponseError } from 'vscode-languageserver';
import type { Subject } from '../language/subject.ts';
import type { Analyses, Failed } from './analyses.ts';

interface AboutDocument {
  readonly textDocument: { readonly uri: string };
}

export type Handler<Params, Result> = (params: Params, token: CancellationToken) => Promise<Result>;

/** Turns features into request handlers that answer for the version asked about, or not at all. */
export interface Answers {
  /** `none` answers for a document that is not open or whose analysis failed. */
  about<Params extends AboutDocument, Result>(
    feature: (subject: Subject, params: Params) => Result | Promise<Result>,
    none: Result,
  ): Handler<Params, Result>;
  /** The same for our own requests, whose parameters may be anything until `uriOf` has found a document in them. */
  own<Result>(
    uriOf: (params: unknown) => string | undefined,
    feature: (analysed: Subject | Failed, params: unknown, stillWanted: () => boolean) => Result | Promise<Result>,
  ): Handler<unknown, Result | null>;
}

/** `versionOf` an open document as it is now. */
export function createAnswers(analyses: Analyses, versionOf: (uri: string) => number | undefined): Answers {
  const answer = async <Result>(
    uri: string,
    token: CancellationToken,
    feature: (analysed: Subject | Failed, stillWanted: () => boolean) => Result | Promise<Result>,
    none: Result,
  ): Promise<Result> => {
    const asked = versionOf(uri);
    const stillWanted = (): boolean => !token.isCancellationRequested && versionOf(uri) === asked;
    // What has come in meanwhile (a cancellation, the next keystroke) is read before any work is done.
    await pause();
    refuseStale(stillWanted, token);
    const analysed = analyses.of(uri);
    if (analysed === undefined) return none;
    const result = await feature(analysed, stillWanted);
    refuseStale(stillWanted, token);
    return result;
  };
  return {
    about: (feature, none) => (params, token) =>
      answer(
        params.textDocument.uri,
        token,
        (analysed) => ('failure' in analysed ? none : feature(analysed, params)),
        none,
      ),
    own: (uriOf, feature) => async (params, token) => {
      const uri = uriOf(params);
      if (uri === undefined) return null;
      return answer(uri, token, (analysed, stillWanted) => feature(analysed, params, stillWanted), null);
    },
  };
}

function refuseStale(stillWanted: () => boolean, token: CancellationToken): void {
  if (stillWanted()) return;
  const code = token.isCancellationRequested ? LSPErrorCodes.RequestCancelled : LSPErrorCodes.ContentModified;
  throw new ResponseError(code, 'The document has changed or the answer is no longer wanted.');
}

/** Lets other messages be read. */
export function pause(): Promise<void> {
  return new Promise((resume) => setTimeout(resume, 0));
}
