import type { ExtensionContext } from 'vscode';
import { LanguageClient, TransportKind } from 'vscode-languageclient/node';
import { activateWith } from './activate.ts';
import { clientOptions } from './client-options.ts';

/** Where there are processes: the language server is one of its own. */
export async function activate(context: ExtensionContext): Promise<void> {
  const server = { module: context.asAbsolutePath('dist/server.cjs'), transport: TransportKind.ipc };
  const client = new LanguageClient('giantpulse', 'Giant Pulse', server, await clientOptions(context));
  activateWith(context, client);
  await client.start();
}
