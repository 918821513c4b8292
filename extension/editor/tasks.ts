import {
  CustomExecution,
  type Disposable,
  EventEmitter,
  type Pseudoterminal,
  Task,
  type TaskDefinition,
  TaskScope,
  tasks,
  type Uri,
  workspace,
} from 'vscode';
import { counted, designInFront } from './designs.ts';
import type { ServerQuestions } from './server-questions.ts';

export const taskType = 'giantpulse';

type What = 'design' | 'workspace';

const NAMES: Readonly<Record<What, string>> = { design: 'check this design', workspace: 'check workspace' };

/**
 * Tasks that print what the command's `check` prints. They ask the language server, not a program: nothing has to be on
 * the PATH, and they work where the editor has no processes or the files are not on a disk.
 */
export function registerTasks(server: ServerQuestions): Disposable {
  return tasks.registerTaskProvider(taskType, {
    provideTasks: () => [checkTask('design', server), checkTask('workspace', server)],
    resolveTask: ({ definition }) =>
      isWhat(definition['check']) ? checkTask(definition['check'], server, definition) : undefined,
  });
}

export function checkTask(
  what: What,
  server: ServerQuestions,
  definition: TaskDefinition = { type: taskType, check: what },
): Task {
  const execution = new CustomExecution(async () => terminal((print) => check(what, server, print)));
  const task = new Task(definition, TaskScope.Workspace, NAMES[what], 'Giant Pulse', execution, '$giantpulse');
  task.presentationOptions = { clear: true };
  return task;
}

function isWhat(value: unknown): value is What {
  return value === 'design' || value === 'workspace';
}

/** A terminal that shows what `run` prints and closes with the exit code that it gives. */
function terminal(run: (print: (line: string) => void) => Promise<number>): Pseudoterminal {
  const written = new EventEmitter<string>();
  const closed = new EventEmitter<number>();
  const print = (line: string): void => written.fire(`${line}\r\n`);
  return {
    onDidWrite: written.event,
    onDidClose: closed.event,
    async open() {
      try {
        closed.fire(await run(print));
      } catch (error) {
        print(`giantpulse: ${error instanceof Error ? error.message : String(error)}`);
        closed.fire(2);
      }
    },
    close: () => undefined,
  };
}

/** 0 without errors, 1 with errors, 2 where nothing could be checked: as the command ends. */
async function check(what: What, server: ServerQuestions, print: (line: string) => void): Promise<number> {
  const designs =
    what === 'design'
      ? [designInFront()].filter((uri) => uri !== undefined)
      : await workspace.findFiles('**/*.gainmodule.{yaml,yml}', '**/node_modules/**');
  if (designs.length === 0) {
    print(
      what === 'design'
        ? 'giantpulse: no design is open in front'
        : 'giantpulse: no *.gainmodule.yaml in this workspace',
    );
    return 2;
  }
  const total = { errors: 0, warnings: 0, accepted: 0 };
  for (const uri of [...designs].sort((a, b) => (a.path < b.path ? -1 : 1))) {
    const result = await server.check({ file: workspace.asRelativePath(uri), text: await textOf(uri) });
    for (const line of result.lines) print(line);
    total.errors += result.errors;
    total.warnings += result.warnings;
    total.accepted += result.accepted;
  }
  const { errors, warnings, accepted } = total;
  const also = accepted === 0 ? '' : `, ${accepted} accepted`;
  print(
    `${counted(designs.length, 'design')} checked: ${counted(errors, 'error')}, ${counted(warnings, 'warning')}${also}`,
  );
  return errors === 0 ? 0 : 1;
}

/** An open document as it stands, saved or not; otherwise the file, which is not opened for that. */
async function textOf(uri: Uri): Promise<string> {
  const open = workspace.textDocuments.find((document) => document.uri.toString() === uri.toString());
  return open?.getText() ?? new TextDecoder().decode(await workspace.fs.readFile(uri));
}
