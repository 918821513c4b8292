import type { TextDocument } from 'vscode';

export const languageId = 'gainmodule';

export function isDesign(document: TextDocument): boolean {
  return document.languageId === languageId;
}
