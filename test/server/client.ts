import { type ChildProcessWithoutNullStreams, spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import {
  createProtocolConnection,
  DidChangeTextDocumentNotification,
  DidCloseTextDocumentNotification,
  DidOpenTextDocumentNotification,
  InitializedNotification,
  InitializeRequest,
  type ProtocolConnection,
  PublishDiagnosticsNotification,
  type PublishDiagnosticsParams,
  type Range,
  StreamMessageReader,
  StreamMessageWriter,
} from 'vscode-languageserver-protocol/node';

const commandBundle = fileURLToPath(new URL('../../dist/giantpulse.cjs', import.meta.url));
const bundle = fileURLToPath(new URL('../../dist/server.cjs', import.meta.url));

/** A client of the shipped server, over its standard streams, as any editor would be. */
export interface ServerUnderTest {
  readonly process: ChildProcessWithoutNullStreams;
  readonly connection: ProtocolConnection;
  /** Every published list so far, oldest first. */
  readonly published: readonly PublishDiagnosticsParams[];
  readonly exitCode: Promise<number | null>;
  open(uri: string, text: string, version?: number): Promise<void>;
  change(uri: string, version: number, ...changes: { range: Range; text: string }[]): Promise<void>;
  close(uri: string): Promise<void>;
  /** The first list published for this version of the document. */
  problemsOf(uri: string, version: number): Promise<PublishDiagnosticsParams>;
}

/** `command`: as any editor starts it; otherwise the bundle that VS Code starts. */
export async function startServer(initializationOptions: unknown = {}, command = false): Promise<ServerUnderTest> {
  const args = command ? [commandBundle, 'serve', '--stdio'] : [bundle, '--stdio'];
  const process = spawn(globalThis.process.execPath, args);
  const connection = createProtocolConnection(
    new StreamMessageReader(process.stdout),
    new StreamMessageWriter(process.stdin),
  );
  const published: PublishDiagnosticsParams[] = [];
  const waiting = new Set<() => void>();
  connection.onNotification(PublishDiagnosticsNotification.type, (params) => {
    published.push(params);
    for (const look of waiting) look();
  });
  connection.listen();
  await connection.sendRequest(InitializeRequest.type, {
    processId: null,
    rootUri: null,
    capabilities: {},
    initializationOptions,
  });
  await connection.sendNotification(InitializedNotification.type, {});
  return {
    process,
    connection,
    published,
    exitCode: new Promise((resolve) => process.once('exit', resolve)),
    open: (uri, text, version = 1) =>
      connection.sendNotification(DidOpenTextDocumentNotification.type, {
        textDocument: { uri, languageId: 'gainmodule', version, text },
      }),
    change: (uri, version, ...contentChanges) =>
      connection.sendNotification(DidChangeTextDocumentNotification.type, {
        textDocument: { uri, version },
        contentChanges,
      }),
    close: (uri) => connection.sendNotification(DidCloseTextDocumentNotification.type, { textDocument: { uri } }),
    problemsOf: (uri, version) =>
      new Promise((resolve, reject) => {
        const late = setTimeout(() => reject(new Error(`no problems of ${uri} version ${version} in 20 s`)), 20_000);
        const look = (): void => {
          const found = published.find((params) => params.uri === uri && params.version === version);
          if (found === undefined) return;
          clearTimeout(late);
          waiting.delete(look);
          resolve(found);
        };
        waiting.add(look);
        look();
      }),
  };
}
