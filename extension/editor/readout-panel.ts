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
import { isPageMemory } from '../protocol/guard.ts';
import { designInFront, isDesign } from './designs.ts';
import type { Pins } from './pins.ts';
import { createReadout, type Readout } from './readout.ts';
import type { ServerQuestions } from './server-questions.ts';

const viewType = 'giantpulse.readout';
/** Known to menus and keys while the design that is edited has a pinned state. */
const pinnedContext = 'giantpulse.pinned';

export interface ReadoutPanel extends Disposable {
  analysed(uri: string): void;
}

/** One readout for the window, beside the text; it follows the design that is being edited. */
export function registerReadout(context: ExtensionContext, server: ServerQuestions, pins: Pins): ReadoutPanel {
  let readout: Readout | undefined;

  const tellPinned = (): void => {
    const uri = readout?.shown ?? designInFront();
    void commands.executeCommand(
      'setContext',
      pinnedContext,
      uri !== undefined && pins.of(server.uriOf(uri)) !== undefined,
    );
  };
  const setPin = async (uri: Uri, pin: boolean): Promise<void> => {
    const key = server.uriOf(uri);
    if (!pin) await pins.drop(key);
    else {
      const present = readout?.shown.toString() === uri.toString() ? readout.present() : undefined;
      const state = present?.state ?? (await server.readout(uri));
      if (state !== undefined)
        await pins.keep(key, { state, ...(present?.exploration && { exploration: present.exploration }) });
    }
    readout?.pinsChanged();
    tellPinned();
  };
  const adopt = (panel: WebviewPanel, uri: Uri): void => {
    const dist = Uri.joinPath(context.extensionUri, 'dist');
    readout = createReadout(panel, dist, server, pins, uri, (shown, pin) => void setPin(shown, pin));
    panel.onDidDispose(() => {
      readout = undefined;
    });
    tellPinned();
  };
  const follow = (editor: TextEditor | undefined): void => {
    if (editor === undefined || !isDesign(editor.document)) return;
    readout?.show(editor.document.uri);
    tellPinned();
  };
  const show = (): void => {
    const uri = designInFront();
    if (uri === undefined) return;
    if (readout !== undefined) {
      readout.show(uri);
      readout.reveal();
      return;
    }
    const place = { viewColumn: ViewColumn.Beside, preserveFocus: true };
    adopt(window.createWebviewPanel(viewType, 'Pulse Readout', place), uri);
  };
  const pinShown = (pin: boolean) => async (): Promise<void> => {
    const uri = readout?.shown ?? designInFront();
    if (uri !== undefined) await setPin(uri, pin);
  };

  const registered = Disposable.from(
    commands.registerCommand('giantpulse.showReadout', show),
    commands.registerCommand('giantpulse.pin', pinShown(true)),
    commands.registerCommand('giantpulse.unpin', pinShown(false)),
    window.registerWebviewPanelSerializer(viewType, {
      async deserializeWebviewPanel(panel, memory: unknown) {
        if (isPageMemory(memory)) adopt(panel, Uri.parse(memory.uri));
        else panel.dispose();
      },
    }),
    window.onDidChangeActiveTextEditor(follow),
    window.onDidChangeTextEditorSelection(({ textEditor, selections: [first] }) => {
      if (first !== undefined) readout?.cursor(textEditor.document.uri, first.active.line + 1);
    }),
  );
  return { analysed: (uri) => readout?.analysed(uri), dispose: () => registered.dispose() };
}
