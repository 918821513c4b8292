import {
  type CodeAction,
  commands,
  type Diagnostic,
  extensions,
  type Hover,
  languages,
  MarkdownString,
  type Position,
  Range,
  type TextDocument,
  Uri,
  WorkspaceEdit,
  window,
  workspace,
} from 'vscode';

export interface Case {
  readonly name: string;
  readonly run: () => Promise<void>;
}

/** A file of the test workspace, shown in the editor. */
export async function show(name: string): Promise<TextDocument> {
  const folder = workspace.workspaceFolders?.[0];
  if (folder === undefined) throw new Error('the window has no folder');
  const document = await workspace.openTextDocument(Uri.joinPath(folder.uri, name));
  await window.showTextDocument(document, { preview: false });
  return document;
}

/** The first value that is not undefined, asked for again and again. */
export async function until<T>(what: string, look: () => T | undefined | Promise<T | undefined>): Promise<T> {
  const end = performance.now() + 15_000;
  for (;;) {
    const found = await look();
    if (found !== undefined) return found;
    if (performance.now() > end) throw new Error(`waited 15 s for ${what}`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

export function problemsOf(document: TextDocument): readonly Diagnostic[] {
  return languages.getDiagnostics(document.uri).filter(({ source }) => source === 'Giant Pulse');
}

export function codeOf({ code }: Diagnostic): string {
  return String(typeof code === 'object' ? code.value : code);
}

/** Where a piece of text stands for the first time. */
export function placeOf(document: TextDocument, text: string): Range {
  const offset = document.getText().indexOf(text);
  if (offset < 0) throw new Error(`the document has no ${text}`);
  return new Range(document.positionAt(offset), document.positionAt(offset + text.length));
}

export async function hoverText(document: TextDocument, position: Position): Promise<string> {
  const hovers = await commands.executeCommand<Hover[]>('vscode.executeHoverProvider', document.uri, position);
  return hovers
    .flatMap(({ contents }) => contents)
    .map((content) => (content instanceof MarkdownString ? content.value : String(content)))
    .join('\n');
}

export function fixesAt(document: TextDocument, range: Range): Thenable<CodeAction[]> {
  return commands.executeCommand<CodeAction[]>('vscode.executeCodeActionProvider', document.uri, range, 'quickfix');
}

/** Undoes what a test has typed, so that the next one finds the file as it is on disk. */
export async function revert(document: TextDocument): Promise<void> {
  await window.showTextDocument(document);
  await commands.executeCommand('workbench.action.files.revert');
}

export function ourExtension() {
  const extension = extensions.getExtension('giant-pulse.giantpulse');
  if (extension === undefined) throw new Error('the extension is not known');
  return extension;
}

/** Lines that the runner recognises as the suite's own. */
export function say(text: string): void {
  for (const line of text.split('\n')) {
    console.log(`[suite] ${line}`);
    told.push(line);
  }
}

const told: string[] = [];

/** On a desktop the lines are read from a file, which only the extension host can name. */
export async function writeReport(): Promise<void> {
  const report = typeof process === 'undefined' ? undefined : process.env['GIANTPULSE_SUITE_REPORT'];
  if (report !== undefined)
    await workspace.fs.writeFile(Uri.file(report), new TextEncoder().encode(`${told.join('\n')}\n`));
}

/** Edits a document as typing would, in one step. */
export async function replace(document: TextDocument, from: string, to: string): Promise<void> {
  const edit = new WorkspaceEdit();
  edit.replace(document.uri, placeOf(document, from), to);
  if (!(await workspace.applyEdit(edit))) throw new Error(`the edit of ${from} was refused`);
}
