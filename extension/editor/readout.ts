import {
  env,
  Selection,
  TextEditorRevealType,
  type Uri,
  ViewColumn,
  type WebviewPanel,
  window,
  workspace,
} from 'vscode';
import type { LanguageClient } from 'vscode-languageclient/node';
import { isPageMessage, isReadoutState } from '../protocol/guard.ts';
import { type HostMessage, type PageMessage, unreachable } from '../protocol/messages.ts';
import { type ReadoutParams, readoutRequest } from '../protocol/requests.ts';
import { readoutPage } from './readout-page.ts';

export interface Readout {
  /** Shows this design from now on. */
  show(uri: Uri): void;
  /** Brings the panel to the front, the text keeping the focus. */
  reveal(): void;
  /** The server has a new analysis of this document. */
  analysed(uri: string): void;
}

/** Drives one panel: asks the server for the state of the design shown and hands it to the page. */
export function createReadout(panel: WebviewPanel, dist: Uri, client: LanguageClient, first: Uri): Readout {
  let shown = first;

  const stateOf = async (uri: Uri): Promise<HostMessage> => {
    try {
      // A readout restored with the window may be there before its design: opening tells the server about it.
      await workspace.openTextDocument(uri);
      const params: ReadoutParams = { uri: client.code2ProtocolConverter.asUri(uri) };
      const state: unknown = await client.sendRequest(readoutRequest, params);
      if (isReadoutState(state)) return { type: 'state', state };
      return { type: 'unavailable', reason: `${workspace.asRelativePath(uri)} is not open as a gain-module design.` };
    } catch (error) {
      const reason = error instanceof Error ? error.message : String(error);
      return { type: 'unavailable', reason: `${workspace.asRelativePath(uri)} can't be shown: ${reason}` };
    }
  };
  const refresh = async (): Promise<void> => {
    const asked = shown;
    const message = await stateOf(asked);
    // Another design may have come to the front while the server answered.
    if (asked === shown) await panel.webview.postMessage(message);
  };
  const perform = async (message: PageMessage): Promise<void> => {
    switch (message.type) {
      case 'ready':
        return refresh();
      case 'copy':
        return env.clipboard.writeText(message.text);
      case 'reveal':
        return revealLine(shown, message.line);
      default:
        return unreachable(message);
    }
  };

  panel.webview.options = { enableScripts: true, localResourceRoots: [dist] };
  panel.webview.onDidReceiveMessage((message: unknown) => {
    if (isPageMessage(message)) void perform(message);
  });
  panel.webview.html = readoutPage(panel.webview, dist);

  return {
    show(uri) {
      if (uri.toString() === shown.toString()) return;
      shown = uri;
      void refresh();
    },
    reveal: () => panel.reveal(undefined, true),
    analysed(uri) {
      if (uri === client.code2ProtocolConverter.asUri(shown)) void refresh();
    },
  };
}

async function revealLine(uri: Uri, line: number): Promise<void> {
  const beside = window.visibleTextEditors.find(({ document }) => document.uri.toString() === uri.toString());
  const editor = await window.showTextDocument(uri, { viewColumn: beside?.viewColumn ?? ViewColumn.One });
  const start = editor.document.lineAt(Math.min(line, editor.document.lineCount) - 1).range.start;
  editor.selection = new Selection(start, start);
  editor.revealRange(editor.selection, TextEditorRevealType.InCenterIfOutsideViewport);
}
