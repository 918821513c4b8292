import {
  CodeActionKind,
  type Connection,
  type InitializeResult,
  TextDocumentSyncKind,
  TextDocuments,
} from 'vscode-languageserver';
import { TextDocument } from 'vscode-languageserver-textdocument';
import type { Analysis } from '../core/analyse.ts';
import { codeActions } from '../language/code-actions.ts';
import { diagnostics, internalFailure } from '../language/diagnostics.ts';
import { hover } from '../language/hover.ts';
import { rangeIn } from '../language/range.ts';
import { failedReadout, readout } from '../language/readout.ts';
import { isReadoutParams, serverOptions } from '../protocol/guard.ts';
import { type AnalysedParams, analysedNotification, type ReadoutResult, readoutRequest } from '../protocol/requests.ts';
import { createAnalyses } from './analyses.ts';
import { createPublisher } from './publisher.ts';

/** Serves the design language on a connection until its client ends it. */
export function serve(connection: Connection, analyse: (text: string) => Analysis): void {
  const documents = new TextDocuments(TextDocument);
  const analyses = createAnalyses(documents, analyse);
  let checksUri: string | undefined;

  connection.onInitialize(({ initializationOptions }): InitializeResult => {
    checksUri = serverOptions(initializationOptions).checksUri;
    return {
      serverInfo: { name: 'Giant Pulse' },
      capabilities: {
        textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
        hoverProvider: true,
        codeActionProvider: { codeActionKinds: [CodeActionKind.QuickFix] },
      },
    };
  });

  const publisher = createPublisher((uri) => {
    const analysed = analyses.of(uri);
    if (analysed === undefined) return;
    const { document, version } = analysed;
    const found =
      'failure' in analysed
        ? [internalFailure(analysed.failure, checksUri)]
        : diagnostics(analysed.analysis, rangeIn(document), checksUri);
    void connection.sendDiagnostics({ uri, version, diagnostics: found });
    const params: AnalysedParams = { uri, version };
    void connection.sendNotification(analysedNotification, params);
  });
  documents.onDidChangeContent(({ document }) => publisher.changed(document.uri));
  documents.onDidClose(({ document: { uri } }) => {
    publisher.closed(uri);
    analyses.forget(uri);
    void connection.sendDiagnostics({ uri, diagnostics: [] });
  });

  connection.onHover(({ textDocument, position }) => {
    const analysed = analyses.of(textDocument.uri);
    if (analysed === undefined || 'failure' in analysed) return null;
    const { document, analysis } = analysed;
    return hover(analysis, document.offsetAt(position), rangeIn(document)) ?? null;
  });

  connection.onCodeAction(({ textDocument, range }) => {
    const analysed = analyses.of(textDocument.uri);
    if (analysed === undefined || 'failure' in analysed) return [];
    const { document, analysis } = analysed;
    const selected = { start: document.offsetAt(range.start), end: document.offsetAt(range.end) };
    return codeActions(analysis, selected, { uri: document.uri, toRange: rangeIn(document), checksUri });
  });

  connection.onRequest(readoutRequest, (params: unknown): ReadoutResult => {
    if (!isReadoutParams(params)) return null;
    const analysed = analyses.of(params.uri);
    if (analysed === undefined) return null;
    const { document, version } = analysed;
    const about = { uri: document.uri, version, lineOf: (offset: number) => document.positionAt(offset).line + 1 };
    return 'failure' in analysed ? failedReadout(analysed.failure, about) : readout(analysed.analysis, about);
  });

  documents.listen(connection);
  connection.listen();
}
