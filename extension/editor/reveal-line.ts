import { Selection, TextEditorRevealType, type Uri, ViewColumn, window } from 'vscode';

/** Puts the cursor on a line (from 1) of a document, in the editor that shows it if there is one. */
export async function revealLine(uri: Uri, line: number): Promise<void> {
  const beside = window.visibleTextEditors.find(({ document }) => document.uri.toString() === uri.toString());
  const editor = await window.showTextDocument(uri, { viewColumn: beside?.viewColumn ?? ViewColumn.One });
  const start = editor.document.lineAt(Math.min(line, editor.document.lineCount) - 1);
  const at = start.range.start.translate(0, start.firstNonWhitespaceCharacterIndex);
  editor.selection = new Selection(at, at);
  editor.revealRange(editor.selection, TextEditorRevealType.InCenterIfOutsideViewport);
}
