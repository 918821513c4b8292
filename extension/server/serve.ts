import {
  CodeActionKind,
  CodeLensRefreshRequest,
  type Connection,
  type InitializeResult,
  InlayHintRefreshRequest,
  TextDocumentSyncKind,
  TextDocuments,
} from 'vscode-languageserver';
import { TextDocument } from 'vscode-languageserver-textdocument';
import type { Analysis } from '../core/analyse.ts';
import { diagnostics, internalFailure, relatedDiagnostics } from '../language/diagnostics.ts';
import { headlineText } from '../language/headline.ts';
import { serverOptions, settingsOf } from '../protocol/guard.ts';
import {
  type AnalysedParams,
  analysedNotification,
  defaultSettings,
  type ServerOptions,
  type Settings,
} from '../protocol/requests.ts';
import { createAnalyses } from './analyses.ts';
import { createAnswers } from './answers.ts';
import { createDeepener } from './deepening.ts';
import { answerEditor } from './editor-requests.ts';
import { createPublisher } from './publisher.ts';
import { answerReadout } from './readout-requests.ts';

/** Serves the design language on a connection until its client ends it. */
export function serve(connection: Connection, analyse: (text: string) => Analysis): void {
  const documents = new TextDocuments(TextDocument);
  const analyses = createAnalyses(documents, analyse);
  const answers = createAnswers(analyses, (uri) => documents.get(uri)?.version);
  let options: ServerOptions = {};
  let settings: Settings = defaultSettings;
  let refreshes: readonly (() => Promise<void>)[] = [];

  connection.onInitialize(({ initializationOptions, capabilities }): InitializeResult => {
    options = serverOptions(initializationOptions);
    settings = options.settings ?? defaultSettings;
    refreshes = [
      ...(capabilities.workspace?.codeLens?.refreshSupport
        ? [() => connection.sendRequest(CodeLensRefreshRequest.type)]
        : []),
      ...(capabilities.workspace?.inlayHint?.refreshSupport
        ? [() => connection.sendRequest(InlayHintRefreshRequest.type)]
        : []),
    ];
    return {
      serverInfo: { name: 'Giant Pulse' },
      capabilities: {
        textDocumentSync: { openClose: true, change: TextDocumentSyncKind.Incremental },
        hoverProvider: true,
        codeActionProvider: { codeActionKinds: [CodeActionKind.QuickFix] },
        completionProvider: { triggerCharacters: [' ', ':', '{', ','] },
        codeLensProvider: { resolveProvider: false },
        inlayHintProvider: { resolveProvider: false },
        documentSymbolProvider: true,
        definitionProvider: true,
        foldingRangeProvider: true,
      },
    };
  });
  connection.onDidChangeConfiguration(({ settings: sent }: { readonly settings: unknown }) => {
    settings = settingsOf(
      typeof sent === 'object' && sent !== null && 'giantpulse' in sent ? sent.giantpulse : undefined,
    );
    for (const refresh of refreshes) void refresh();
  });

  const deepener = createDeepener(
    ({ uri, version }) => documents.get(uri)?.version === version,
    (subject) => {
      const related = relatedDiagnostics(subject, options.checksUri);
      const { uri, version } = subject;
      if (related !== undefined) void connection.sendDiagnostics({ uri, version, diagnostics: related });
    },
  );
  const publisher = createPublisher((uri) => {
    const analysed = analyses.of(uri);
    if (analysed === undefined) return;
    const { version } = analysed;
    const found =
      'failure' in analysed
        ? [internalFailure(analysed.failure, options.checksUri)]
        : diagnostics(analysed, options.checksUri);
    void connection.sendDiagnostics({ uri, version, diagnostics: found });
    const params: AnalysedParams = {
      uri,
      version,
      headline: 'failure' in analysed ? 'failed' : headlineText(analysed.analysis),
      errors: found.filter(({ severity }) => severity === 1).length,
      warnings: found.filter(({ severity }) => severity === 2).length,
    };
    void connection.sendNotification(analysedNotification, params);
    if (!('failure' in analysed)) deepener.deepen(analysed);
  });
  documents.onDidChangeContent(({ document }) => publisher.changed(document.uri));
  documents.onDidClose(({ document: { uri } }) => {
    publisher.closed(uri);
    analyses.forget(uri);
    void connection.sendDiagnostics({ uri, diagnostics: [] });
  });

  answerEditor(connection, answers, () => ({ ...options, settings }));
  answerReadout(connection, answers, analyse);
  documents.listen(connection);
  connection.listen();
}
