import { Uri, window, workspace } from 'vscode';
import type { ChartId } from '../protocol/chart.ts';

export interface ExportFile {
  readonly chart: ChartId | 'figures';
  readonly extension: 'csv' | 'svg' | 'png' | 'txt';
  readonly bytes: Uint8Array;
  /** Where to, without asking. */
  readonly target?: Uri;
}

/** Saves an export where the user says, beside the design if he says nothing; undefined where he changes his mind. */
export async function saveExport(design: Uri, file: ExportFile): Promise<Uri | undefined> {
  const target =
    file.target ??
    (await window.showSaveDialog({
      defaultUri: suggested(design, file),
      filters: { [file.extension.toUpperCase()]: [file.extension] },
      saveLabel: 'Export',
    }));
  if (target === undefined) return undefined;
  await workspace.fs.writeFile(target, file.bytes);
  return target;
}

/** `hail_lidar-waveform.csv` beside the design, or in the workspace for a design that has no file yet. */
function suggested(design: Uri, { chart, extension }: ExportFile): Uri {
  const name = design.path.slice(design.path.lastIndexOf('/') + 1).replace(/\.(gainmodule\.)?ya?ml$/, '') || 'design';
  const file = `${name}-${chart.replaceAll('_', '-')}.${extension}`;
  if (design.scheme !== 'untitled') return Uri.joinPath(design, '..', file);
  const [folder] = workspace.workspaceFolders ?? [];
  return folder === undefined ? Uri.file(file) : Uri.joinPath(folder.uri, file);
}

/** The bytes of `data:image/png;base64,…`. */
export function pngBytes(dataUrl: string): Uint8Array {
  const text = atob(dataUrl.slice(dataUrl.indexOf(',') + 1));
  return Uint8Array.from(text, (character) => character.charCodeAt(0));
}
