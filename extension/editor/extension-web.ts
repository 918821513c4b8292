/// <reference lib="webworker" />
import { type ExtensionContext, Uri, workspace } from 'vscode';
import { LanguageClient } from 'vscode-languageclient/browser';
import { activateWith } from './activate.ts';
import { clientOptions } from './client-options.ts';

/** In a browser: the language server is a worker. */
export async function activate(context: ExtensionContext): Promise<void> {
  const worker = await startWorker(Uri.joinPath(context.extensionUri, 'dist/server-worker.js'));
  const client = new LanguageClient('giantpulse', 'Giant Pulse', await clientOptions(context), worker);
  context.subscriptions.push({ dispose: () => worker.terminate() });
  activateWith(context, client);
  await client.start();
}

/** From the script's text: a worker can't be made from the address of an extension that lies on a remote machine. */
async function startWorker(script: Uri): Promise<Worker> {
  const text = await workspace.fs.readFile(script);
  const address = URL.createObjectURL(new Blob([new Uint8Array(text)], { type: 'text/javascript' }));
  const worker = new Worker(address);
  URL.revokeObjectURL(address);
  return worker;
}
