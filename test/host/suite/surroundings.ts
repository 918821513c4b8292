import { commands, env, TabInputWebview, tasks, Uri, window, workspace } from 'vscode';
import * as assert from './assert.ts';
import { type Case, ourExtension, problemsOf, show, until } from './harness.ts';

const sound = 'transmitter.gainmodule.yaml';

function inFolder(name: string): Uri {
  const folder = workspace.workspaceFolders?.[0];
  if (folder === undefined) throw new Error('the window has no folder');
  return Uri.joinPath(folder.uri, name);
}

const textOf = async (uri: Uri) => new TextDecoder().decode(await workspace.fs.readFile(uri));

/** Runs one of our tasks to its end; its exit code, where the host tells it. */
async function runTask(command: string): Promise<number | undefined> {
  const ended = new Promise<number | undefined>((done) => {
    const watch = tasks.onDidEndTaskProcess(({ execution, exitCode }) => {
      if (execution.task.definition.type !== 'giantpulse') return;
      watch.dispose();
      done(exitCode);
    });
    const other = tasks.onDidEndTask(({ execution }) => {
      if (execution.task.definition.type !== 'giantpulse') return;
      other.dispose();
      setTimeout(() => done(undefined), 500);
    });
  });
  await commands.executeCommand(command);
  return ended;
}

export const surroundings: readonly Case[] = [
  {
    name: 'a new design from the template predicts a pulse, its title selected',
    async run() {
      await commands.executeCommand('giantpulse.newDesign');
      const editor = await until('the editor', () => window.activeTextEditor);
      assert.equal(editor.document.languageId, 'gainmodule');
      assert.match(editor.document.uri.path, /^gain_module(_\d+)?\.gainmodule\.yaml$/);
      assert.equal(editor.document.getText(editor.selection), 'New gain module');
      await until('no problem', async () => problemsOf(editor.document).length === 0 || undefined);
      await commands.executeCommand('workbench.action.revertAndCloseActiveEditor');
    },
  },
  {
    name: 'figures are copied, charts exported as data and as pictures',
    async run() {
      await show(sound);
      await commands.executeCommand('giantpulse.copyFigures');
      await until(
        'the figures',
        async () => /Pulse energy: 13\.\d mJ/.test(await env.clipboard.readText()) || undefined,
      );
      const csv = inFolder('out.csv');
      await commands.executeCommand('giantpulse.exportChart', { chart: 'waveform', format: 'csv', target: csv });
      assert.match(await textOf(csv), /^time_from_the_peak_ns,output_power_MW,inversion\r\n/);
      const svg = inFolder('out.svg');
      await commands.executeCommand('giantpulse.exportChart', { chart: 'reflectivity', format: 'svg', target: svg });
      assert.match(await textOf(svg), /^<svg [\s\S]*optimum \d+\.\d %[\s\S]*<\/svg>\s*$/);
      for (const file of [csv, svg]) await workspace.fs.delete(file);
    },
  },
  {
    name: 'a state is pinned and unpinned, with and without the readout',
    async run() {
      await show(sound);
      await commands.executeCommand('giantpulse.pin');
      await commands.executeCommand('giantpulse.showReadout');
      const tab = await until('the readout', () =>
        window.tabGroups.all.flatMap((group) => group.tabs).find(({ input }) => input instanceof TabInputWebview),
      );
      await commands.executeCommand('giantpulse.unpin');
      await window.tabGroups.close(tab);
    },
  },
  {
    name: 'the task checks the workspace without any program, and finds what the editor finds',
    async run() {
      await show('unit_forgotten.gainmodule.yaml');
      const offered = await tasks.fetchTasks({ type: 'giantpulse' });
      assert.same(offered.map(({ name }) => name).sort(), ['check this design', 'check workspace']);
      const code = await runTask('giantpulse.checkWorkspace');
      if (code !== undefined) assert.equal(code, 1);
      await show(sound);
      const fine = await runTask('giantpulse.checkDesign');
      if (fine !== undefined) assert.equal(fine, 0);
    },
  },
  {
    name: 'a check is explained at its section',
    async run() {
      await commands.executeCommand('giantpulse.explainCheck', 'hold-off');
      const editor = await until('the explanation', () =>
        window.activeTextEditor?.document.fileName.endsWith('checks.md') ? window.activeTextEditor : undefined,
      );
      assert.match(editor.document.lineAt(editor.selection.active.line).text, /id="hold-off"/);
      await commands.executeCommand('workbench.action.closeActiveEditor');
    },
  },
  {
    name: 'every command of the manifest is there',
    async run() {
      const known = await commands.getCommands(true);
      const { contributes } = ourExtension().packageJSON as { contributes: { commands: { command: string }[] } };
      assert.same(
        contributes.commands.map(({ command }) => command).filter((command) => !known.includes(command)),
        [],
      );
    },
  },
];
