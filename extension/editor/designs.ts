import { type TextDocument, type Uri, window } from 'vscode';

export const languageId = 'gainmodule';

export function isDesign(document: TextDocument): boolean {
  return document.languageId === languageId;
}

/** The design in the editor that has, or last had, the focus. */
export function designInFront(): Uri | undefined {
  const document = window.activeTextEditor?.document;
  return document !== undefined && isDesign(document) ? document.uri : undefined;
}

/** `1 error`, `2 errors`. */
export function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}
