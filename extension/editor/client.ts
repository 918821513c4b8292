import { type ExtensionContext, Uri, workspace } from 'vscode';
import { LanguageClient, TransportKind } from 'vscode-languageclient/node';
import type { ServerOptions } from '../protocol/requests.ts';
import { anchorLines, linkTo } from './check-links.ts';

/** Starts the language server as a process of its own; what it sends is converted and shown by the client library. */
export async function startClient(context: ExtensionContext): Promise<LanguageClient> {
  const module = context.asAbsolutePath('dist/server.cjs');
  const checks = Uri.joinPath(context.extensionUri, 'extension/docs/checks.md');
  const lines = await readAnchors(checks);
  const initializationOptions: ServerOptions = { checksUri: checks.toString() };
  const client = new LanguageClient(
    'giantpulse',
    'Giant Pulse',
    { module, transport: TransportKind.ipc },
    {
      documentSelector: ['file', 'untitled', 'vscode-vfs'].map((scheme) => ({ scheme, language: 'gainmodule' })),
      initializationOptions,
      middleware: {
        handleDiagnostics(uri, diagnostics, next) {
          for (const diagnostic of diagnostics) {
            const { code } = diagnostic;
            if (typeof code === 'object') {
              diagnostic.code = { value: code.value, target: linkTo(checks, lines.get(String(code.value))) };
            }
          }
          next(uri, diagnostics);
        },
      },
    },
  );
  await client.start();
  return client;
}

/** Without the file the links still open it, or say that it is not there: no reason to stop. */
async function readAnchors(checks: Uri): Promise<ReadonlyMap<string, number>> {
  try {
    return anchorLines(new TextDecoder().decode(await workspace.fs.readFile(checks)));
  } catch {
    return new Map();
  }
}
