import { CancellationTokenSource, env, type Uri, type WebviewPanel, workspace } from 'vscode';
import { isPageMessage } from '../protocol/guard.ts';
import { type HostMessage, type PageMessage, unreachable } from '../protocol/messages.ts';
import type { ExplorationState, ReadoutState } from '../protocol/readout.ts';
import { pngBytes, saveExport } from './exports.ts';
import type { Pins } from './pins.ts';
import { readoutPage } from './readout-page.ts';
import { revealLine } from './reveal-line.ts';
import type { ServerQuestions } from './server-questions.ts';

export interface Readout {
  readonly shown: Uri;
  /** Shows this design from now on. */
  show(uri: Uri): void;
  /** Brings the panel to the front, the text keeping the focus. */
  reveal(): void;
  /** The server has a new analysis of this document. */
  analysed(uri: string): void;
  /** The cursor stands on this line (from 1) of a document. */
  cursor(uri: Uri, line: number): void;
  /** What is pinned has changed. */
  pinsChanged(): void;
  /** The state and curves that the page has now, to be pinned. */
  present(): { readonly state: ReadoutState; readonly exploration?: ExplorationState } | undefined;
}

/** Drives one panel: asks the server for the state of the design shown and hands it to the page. */
export function createReadout(
  panel: WebviewPanel,
  dist: Uri,
  server: ServerQuestions,
  pins: Pins,
  first: Uri,
  setPin: (uri: Uri, pin: boolean) => void,
): Readout {
  let shown = first;
  let state: ReadoutState | undefined;
  let curves: ExplorationState | undefined;
  let exploring = new CancellationTokenSource();

  const post = (message: HostMessage): Thenable<boolean> => panel.webview.postMessage(message);
  const postState = async (): Promise<void> => {
    if (state === undefined) return;
    const pinned = pins.of(server.uriOf(shown));
    await post({ type: 'state', state, ...(pinned && { pinned }) });
  };
  const refresh = async (): Promise<void> => {
    const asked = shown;
    exploring.cancel();
    exploring = new CancellationTokenSource();
    const { token } = exploring;
    // Another design, or a newer text, may have come to the front while the server answered.
    const isPassed = (): boolean => asked !== shown || token.isCancellationRequested;
    try {
      const answer = await server.readout(asked);
      if (isPassed()) return;
      state = answer;
      curves = undefined;
      if (state === undefined) {
        await post(unavailable(asked, 'is not open as a gain-module design.'));
        return;
      }
      await postState();
      const found = await server.exploration(asked, token);
      if (found === undefined || isPassed() || found.version !== answer?.version) return;
      curves = found;
      await post({ type: 'exploration', exploration: found });
    } catch (error) {
      if (!isPassed()) await post(unavailable(asked, `can't be shown: ${messageOf(error)}`));
    }
  };
  const perform = async (message: PageMessage): Promise<void> => {
    switch (message.type) {
      case 'ready':
        return refresh();
      case 'pin':
        return setPin(shown, message.pin);
      case 'copy': {
        const text = await server.exportText(shown, { what: 'figures', format: 'text' });
        return text === undefined ? undefined : env.clipboard.writeText(text);
      }
      case 'export': {
        const { chart, format } = message;
        const text = await server.exportText(shown, { what: chart, format });
        if (text !== undefined)
          await saveExport(shown, { chart, extension: format, bytes: new TextEncoder().encode(text) });
        return;
      }
      case 'picture':
        await saveExport(shown, { chart: message.chart, extension: 'png', bytes: pngBytes(message.data) });
        return;
      case 'reveal':
        return revealLine(shown, message.line);
      default:
        return unreachable(message);
    }
  };

  panel.webview.options = { enableScripts: true, localResourceRoots: [dist] };
  panel.webview.onDidReceiveMessage((message: unknown) => {
    if (!isPageMessage(message)) return;
    perform(message).catch((error: unknown) => post(unavailable(shown, messageOf(error))));
  });
  panel.onDidDispose(() => exploring.cancel());
  panel.webview.html = readoutPage(panel.webview, dist);

  return {
    get shown() {
      return shown;
    },
    show(uri) {
      if (uri.toString() === shown.toString()) return;
      shown = uri;
      void refresh();
    },
    reveal: () => panel.reveal(undefined, true),
    analysed(uri) {
      if (uri === server.uriOf(shown)) void refresh();
    },
    cursor(uri, line) {
      if (uri.toString() === shown.toString()) void post({ type: 'cursor', line });
    },
    pinsChanged: () => void postState(),
    present: () => state && { state, ...(curves && { exploration: curves }) },
  };
}

function unavailable(uri: Uri, reason: string): HostMessage {
  return { type: 'unavailable', reason: `${workspace.asRelativePath(uri)} ${reason}` };
}

function messageOf(error: unknown): string {
  return error instanceof Error ? error.message : String(error);
}
