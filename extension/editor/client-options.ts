import { type ExtensionContext, Uri, workspace } from 'vscode';
import type { LanguageClientOptions } from 'vscode-languageclient';
import { settingsOf } from '../protocol/guard.ts';
import type { ServerOptions } from '../protocol/requests.ts';
import { anchorLines, linkTo } from './check-links.ts';
import { languageId } from './designs.ts';

const section = 'giantpulse';

/** What the client tells the server, and how it shows what comes back; the same for a process and for a worker. */
export async function clientOptions(context: ExtensionContext): Promise<LanguageClientOptions> {
  const checks = Uri.joinPath(context.extensionUri, 'extension/docs/checks.md');
  const lines = await readAnchors(checks);
  const initializationOptions: ServerOptions = {
    checksUri: checks.toString(),
    readoutCommand: 'giantpulse.showReadout',
    settings: settingsOf(workspace.getConfiguration(section)),
  };
  return {
    // Whatever the file system, an old version beside a diff too: the server is handed the text and reads no files.
    documentSelector: [{ language: languageId }],
    initializationOptions,
    synchronize: { configurationSection: section },
    middleware: {
      handleDiagnostics(uri, diagnostics, next) {
        if (isOnlyLookedAt(uri)) return next(uri, []);
        for (const diagnostic of diagnostics) {
          const { code } = diagnostic;
          if (typeof code === 'object') {
            diagnostic.code = { value: code.value, target: linkTo(checks, lines.get(String(code.value))) };
          }
        }
        next(uri, diagnostics);
      },
    },
  };
}

/**
 * An old version beside a diff, say: read-only, and no file of the workspace. Hovers and figures help to compare; its
 * problems can't be mended and would count twice in the list.
 */
function isOnlyLookedAt(uri: Uri): boolean {
  return workspace.fs.isWritableFileSystem(uri.scheme) === false && workspace.getWorkspaceFolder(uri) === undefined;
}

/** Without the file the links still open it, or say that it is not there: no reason to stop. */
async function readAnchors(checks: Uri): Promise<ReadonlyMap<string, number>> {
  try {
    return anchorLines(new TextDecoder().decode(await workspace.fs.readFile(checks)));
  } catch {
    return new Map();
  }
}
