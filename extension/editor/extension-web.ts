/// <reference lib="webworker" />
import { type ExtensionContext, Uri } from 'vscode';
import { LanguageClient } from 'vscode-languageclient/browser';
import { activateWith } from './activate.ts';
import { clientOptions } from './client-options.ts';

/** In a browser: the language server is a worker. */
export async function activate(context: ExtensionContext): Promise<void> {
  const worker = new Worker(Uri.joinPath(context.extensionUri, 'dist/server-worker.js').toString(true));
  const client = new LanguageClient('giantpulse', 'Giant Pulse', await clientOptions(context), worker);
  context.subscriptions.push({ dispose: () => worker.terminate() });
  activateWith(context, client);
  await client.start();
}
