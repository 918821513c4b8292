import { type Disposable, MarkdownString, StatusBarAlignment, type Uri, window } from 'vscode';
import type { AnalysedParams } from '../protocol/requests.ts';
import { counted, isDesign } from './designs.ts';

export interface Status extends Disposable {
  analysed(params: AnalysedParams): void;
}

/** The pulse of the design in front, in the status bar; nothing while anything else is in front. */
export function createStatus(uriOf: (uri: Uri) => string): Status {
  const item = window.createStatusBarItem('giantpulse.pulse', StatusBarAlignment.Right, 90);
  item.name = 'Predicted pulse';
  item.command = 'giantpulse.showReadout';
  const known = new Map<string, AnalysedParams>();

  const update = (): void => {
    const document = window.activeTextEditor?.document;
    const analysed = document && isDesign(document) ? known.get(uriOf(document.uri)) : undefined;
    if (analysed === undefined) {
      item.hide();
      return;
    }
    const { headline, errors, warnings } = analysed;
    item.text = `$(pulse) ${headline}`;
    const counts = `${counted(errors, 'error')}, ${counted(warnings, 'warning')}`;
    item.tooltip = new MarkdownString(`Predicted pulse: ${headline}\n\n${counts}. Click for the readout.`);
    item.accessibilityInformation = { label: `Predicted pulse ${headline}, ${counts}` };
    item.show();
  };
  const changed = window.onDidChangeActiveTextEditor(update);
  return {
    analysed(params) {
      known.set(params.uri, params);
      update();
    },
    dispose() {
      changed.dispose();
      item.dispose();
    },
  };
}
