import {
  commands,
  Disposable,
  type ExtensionContext,
  type TextEditor,
  Uri,
  ViewColumn,
  type WebviewPanel,
  window,
} from 'vscode';
import type { LanguageClient } from 'vscode-languageclient/node';
import { isAnalysed, isPageMemory } from '../protocol/guard.ts';
import { analysedNotification } from '../protocol/requests.ts';
import { createReadout, type Readout } from './readout.ts';

const viewType = 'giantpulse.readout';
const languageId = 'gainmodule';

/** One readout for the window, beside the text; it follows the design that is being edited. */
export function registerReadout(context: ExtensionContext, client: LanguageClient): Disposable {
  let readout: Readout | undefined;

  const adopt = (panel: WebviewPanel, uri: Uri): void => {
    readout = createReadout(panel, Uri.joinPath(context.extensionUri, 'dist'), client, uri);
    panel.onDidDispose(() => {
      readout = undefined;
    });
  };
  const follow = (editor: TextEditor | undefined): void => {
    if (editor?.document.languageId === languageId) readout?.show(editor.document.uri);
  };

  return Disposable.from(
    commands.registerCommand('giantpulse.showReadout', () => {
      const document = window.activeTextEditor?.document;
      if (document?.languageId !== languageId) return;
      if (readout !== undefined) {
        readout.show(document.uri);
        readout.reveal();
        return;
      }
      const place = { viewColumn: ViewColumn.Beside, preserveFocus: true };
      adopt(window.createWebviewPanel(viewType, 'Pulse Readout', place), document.uri);
    }),
    window.registerWebviewPanelSerializer(viewType, {
      async deserializeWebviewPanel(panel, memory: unknown) {
        if (isPageMemory(memory)) adopt(panel, Uri.parse(memory.uri));
        else panel.dispose();
      },
    }),
    window.onDidChangeActiveTextEditor(follow),
    client.onNotification(analysedNotification, (params: unknown) => {
      if (isAnalysed(params)) readout?.analysed(params.uri);
    }),
  );
}
