import { commands, type ExtensionContext } from 'vscode';
import type { BaseLanguageClient } from 'vscode-languageclient';
import { isAnalysed } from '../protocol/guard.ts';
import { analysedNotification } from '../protocol/requests.ts';
import { registerCommands } from './commands.ts';
import { createPins } from './pins.ts';
import { registerReadout } from './readout-panel.ts';
import { createServerQuestions } from './server-questions.ts';
import { createStatus } from './status.ts';
import { registerTasks } from './tasks.ts';

/** All that the extension offers beside the language itself, the same on the desktop and in a browser. */
export function activateWith(context: ExtensionContext, client: BaseLanguageClient): void {
  const server = createServerQuestions(client);
  const pins = createPins(context.workspaceState);
  const readout = registerReadout(context, server, pins);
  const status = createStatus(server.uriOf);
  context.subscriptions.push(
    client,
    readout,
    status,
    registerCommands(context, server),
    registerTasks(server),
    commands.registerCommand('giantpulse.restartServer', async () => {
      await client.stop();
      await client.start();
    }),
    client.onNotification(analysedNotification, (params: unknown) => {
      if (!isAnalysed(params)) return;
      readout.analysed(params.uri);
      status.analysed(params);
    }),
  );
}
