import {
  EventEmitter,
  type FileStat,
  FileSystemError,
  type FileSystemProvider,
  FileType,
  type TextDocument,
  Uri,
  window,
  workspace,
} from 'vscode';
import * as assert from './assert.ts';
import { type Case, codeOf, fixesAt, hoverText, placeOf, problemsOf, until } from './harness.ts';

/** Files that lie on no disk, as those of a repository opened in a browser. */
class Memory implements FileSystemProvider {
  readonly onDidChangeFile = new EventEmitter<never[]>().event;
  readonly #files = new Map<string, Uint8Array>();

  watch() {
    return { dispose() {} };
  }
  stat(uri: Uri): FileStat {
    if (uri.path === '/') return { type: FileType.Directory, ctime: 0, mtime: 0, size: 0 };
    return { type: FileType.File, ctime: 0, mtime: 0, size: this.readFile(uri).length };
  }
  readDirectory(): [string, FileType][] {
    return [...this.#files.keys()].map((path) => [path.slice(1), FileType.File]);
  }
  readFile({ path }: Uri): Uint8Array {
    const content = this.#files.get(path);
    if (content === undefined) throw FileSystemError.FileNotFound(path);
    return content;
  }
  writeFile({ path }: Uri, content: Uint8Array): void {
    this.#files.set(path, content);
  }
  createDirectory(): void {}
  delete({ path }: Uri): void {
    this.#files.delete(path);
  }
  rename(from: Uri, to: Uri): void {
    this.writeFile(to, this.readFile(from));
    this.delete(from);
  }
}

/** The test workspace's design with a unit forgotten, in a file system of the scheme. */
async function withDesign(
  scheme: string,
  isReadonly: boolean,
  act: (document: TextDocument) => Promise<void>,
): Promise<void> {
  const folder = workspace.workspaceFolders?.[0];
  assert.ok(folder, 'the window has a folder');
  const memory = new Memory();
  const uri = Uri.from({ scheme, path: '/forgotten.gainmodule.yaml' });
  memory.writeFile(uri, await workspace.fs.readFile(Uri.joinPath(folder.uri, 'unit_forgotten.gainmodule.yaml')));
  const registered = workspace.registerFileSystemProvider(scheme, memory, { isReadonly });
  try {
    const document = await workspace.openTextDocument(uri);
    await window.showTextDocument(document);
    await act(document);
  } finally {
    registered.dispose();
  }
}

export const virtualFiles: readonly Case[] = [
  {
    name: 'a file on no disk is checked, explained and fixed like any other',
    run: () =>
      withDesign('giantpulse-memory', false, async (document) => {
        const problem = await until('the problem', () =>
          problemsOf(document).find((found) => codeOf(found) === 'missing-unit'),
        );
        assert.match(await hoverText(document, placeOf(document, 'length: 60').start), /length/i);
        // Asked again: under load the editor has once given an empty list here.
        const edit = await until('a fix with mm', async () => {
          const fixes = await fixesAt(document, problem.range);
          return fixes.find(({ title }) => /\bmm\b/.test(title))?.edit;
        });
        await workspace.applyEdit(edit);
        await until(
          'no problem',
          () => !problemsOf(document).some((found) => codeOf(found) === 'missing-unit') || undefined,
        );
        await document.save();
      }),
  },
  {
    name: 'an old version that can only be looked at has hovers, and no problem in the list',
    run: () =>
      withDesign('giantpulse-old', true, async (document) => {
        const text = await until(
          'the hover',
          async () => (await hoverText(document, placeOf(document, 'output_reflectivity').start)) || undefined,
        );
        assert.match(text, /reflectivity/i);
        // Long enough for the problems of a file that could be edited to be there.
        await new Promise((resolve) => setTimeout(resolve, 1500));
        assert.same(problemsOf(document).map(codeOf), []);
      }),
  },
];
