import { commands, type ExtensionContext } from 'vscode';
import { startClient } from './client.ts';
import { registerReadout } from './readout-panel.ts';

/** Starts the language server and offers the readout; both end with the extension. */
export async function activate(context: ExtensionContext): Promise<void> {
  const client = await startClient(context);
  context.subscriptions.push(
    client,
    registerReadout(context, client),
    commands.registerCommand('giantpulse.restartServer', () => client.restart()),
  );
}
