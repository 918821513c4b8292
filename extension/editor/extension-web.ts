/// <reference lib="webworker" />
import { type ExtensionContext, Uri, workspace } from 'vscode';
import { LanguageClient } from 'vscode-languageclient/browser';
import { activateWith } from './activate.ts';
import { clientOptions } from './client-options.ts';

/** In a browser: the language server is a worker. */
export async function activate(context: ExtensionContext): Promise<void> {
  // From the script's text: a worker can't be made from the address of an extension that lies on a remote machine.
  const script = await workspace.fs.readFile(Uri.joinPath(context.extensionUri, 'dist/server-worker.js'));
  const address = URL.createObjectURL(new Blob([new Uint8Array(script)], { type: 'text/javascript' }));
  const worker = new Worker(address);
  const client = new LanguageClient('giantpulse', 'Giant Pulse', await clientOptions(context), worker);
  context.subscriptions.push({
    dispose() {
      worker.terminate();
      // Not earlier: VS Code hands the address on, and the worker is loaded a good while later.
      URL.revokeObjectURL(address);
    },
  });
  activateWith(context, client);
  await client.start();
}
