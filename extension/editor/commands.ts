import {
  commands,
  Disposable,
  type ExtensionContext,
  env,
  Position,
  Selection,
  tasks,
  Uri,
  window,
  workspace,
} from 'vscode';
import { type ChartId, chartIds } from '../protocol/chart.ts';
import { anchorLines } from './check-links.ts';
import { designInFront } from './designs.ts';
import { saveExport } from './exports.ts';
import { revealLine } from './reveal-line.ts';
import type { ServerQuestions } from './server-questions.ts';
import { checkTask } from './tasks.ts';

/** What an export command may be called with; the rest is asked for. */
interface ExportWish {
  readonly chart?: ChartId;
  readonly format?: 'csv' | 'svg';
  readonly target?: Uri;
}

/** Commands that need no readout. */
export function registerCommands(context: ExtensionContext, server: ServerQuestions): Disposable {
  const register = (name: string, run: (...args: readonly unknown[]) => Promise<unknown>): Disposable =>
    commands.registerCommand(`giantpulse.${name}`, run);
  return Disposable.from(
    register('newDesign', () => newDesign(server)),
    register('copyFigures', () => copyFigures(server)),
    register('exportChart', (wish) => exportChart(server, wish)),
    register('checkDesign', async () => tasks.executeTask(checkTask('design', server))),
    register('checkWorkspace', async () => tasks.executeTask(checkTask('workspace', server))),
    register('explainCheck', (code) => explainCheck(context, typeof code === 'string' ? code : undefined)),
  );
}

/** Opens an unsaved design that predicts a pulse as it is, its title selected. */
async function newDesign(server: ServerQuestions): Promise<void> {
  const content = await server.template();
  // With a name of its own: otherwise the first line would be offered as the file's name.
  const document = await workspace.openTextDocument(freeName());
  const editor = await window.showTextDocument(document);
  await editor.edit((edit) => edit.insert(new Position(0, 0), content));
  const at = content.indexOf('title: ');
  if (at < 0) return;
  const start = document.positionAt(at + 'title: '.length);
  editor.selection = new Selection(start, new Position(start.line, document.lineAt(start).range.end.character));
}

/** The first of `gain_module.gainmodule.yaml`, `gain_module_2…` that no open document has. */
function freeName(): Uri {
  const open = new Set(workspace.textDocuments.map(({ uri }) => uri.path));
  for (let count = 1; ; count++) {
    const path = `gain_module${count === 1 ? '' : `_${count}`}.gainmodule.yaml`;
    if (!open.has(path)) return Uri.from({ scheme: 'untitled', path });
  }
}

async function copyFigures(server: ServerQuestions): Promise<void> {
  const uri = designInFront();
  const text = uri && (await server.exportText(uri, { what: 'figures', format: 'text' }));
  if (text !== undefined) await env.clipboard.writeText(text);
}

const TITLES: Readonly<Record<ChartId, string>> = {
  waveform: 'Waveform',
  reflectivity: 'Energy and width against output reflectivity',
  pump: 'Energy and width against the pump',
  repetition_rate: 'Energy and width against repetition rate',
  surfaces: 'Fluence on the surfaces',
};

async function exportChart(server: ServerQuestions, wish: unknown): Promise<Uri | undefined> {
  const uri = designInFront();
  if (uri === undefined) return undefined;
  const given = wishOf(wish);
  const chart = given.chart ?? (await pick(chartIds, (id) => TITLES[id], 'Which chart?'));
  if (chart === undefined) return undefined;
  const format =
    given.format ?? (await pick(['csv', 'svg'] as const, (name) => name.toUpperCase(), 'As data or as a picture?'));
  const text = format && (await server.exportText(uri, { what: chart, format }));
  if (format === undefined) return undefined;
  if (text === undefined) {
    // Asked for by hand and impossible: the one case in which silence would look like success.
    void window.showWarningMessage('There is no such chart: the design predicts no pulse, or has no surfaces.');
    return undefined;
  }
  const bytes = new TextEncoder().encode(text);
  return saveExport(uri, { chart, extension: format, bytes, ...(given.target && { target: given.target }) });
}

function wishOf(value: unknown): ExportWish {
  if (typeof value !== 'object' || value === null) return {};
  const chart = 'chart' in value ? chartIds.find((id) => id === value.chart) : undefined;
  const format = 'format' in value && (value.format === 'csv' || value.format === 'svg') ? value.format : undefined;
  const target = 'target' in value && value.target instanceof Uri ? value.target : undefined;
  return { ...(chart && { chart }), ...(format && { format }), ...(target && { target }) };
}

async function pick<T extends string>(
  values: readonly T[],
  title: (value: T) => string,
  placeHolder: string,
): Promise<T | undefined> {
  const items = values.map((value) => ({ label: title(value), value }));
  return (await window.showQuickPick(items, { placeHolder }))?.value;
}

/** Opens the section of `checks.md` that explains a code: the one given, else one that is picked. */
async function explainCheck(context: ExtensionContext, code: string | undefined): Promise<void> {
  const file = Uri.joinPath(context.extensionUri, 'extension/docs/checks.md');
  const text = new TextDecoder().decode(await workspace.fs.readFile(file));
  const anchors = anchorLines(text);
  const chosen = code ?? (await pickCheck(text.split(/\r?\n/), anchors));
  if (chosen !== undefined) await revealLine(file, anchors.get(chosen) ?? 1);
}

async function pickCheck(lines: readonly string[], anchors: ReadonlyMap<string, number>): Promise<string | undefined> {
  const items = [...anchors].map(([code, line]) => {
    // An anchor stands two lines above the heading of its section.
    const title = /^##\s+(.*)$/.exec(lines[line + 1] ?? '')?.[1];
    return { label: title ?? code, description: code };
  });
  const options = { placeHolder: 'Which check?', matchOnDescription: true };
  return (await window.showQuickPick(items, options))?.description;
}
