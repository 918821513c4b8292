import { commands, languages, Position, TabInputWebview, window } from 'vscode';
import * as assert from './assert.ts';
import { type Case, hoverText, ourExtension, placeOf, problemsOf, say, show, until } from './harness.ts';

const sound = 'transmitter.gainmodule.yaml';

function readouts() {
  const tabs = window.tabGroups.all.flatMap((group) => group.tabs);
  return tabs.filter(({ input }) => input instanceof TabInputWebview && input.viewType.endsWith('giantpulse.readout'));
}

export const editing: readonly Case[] = [
  {
    name: 'a design has its own language, whichever ending YAML has, and wakes the extension',
    async run() {
      // From the first design that is opened: the extension sleeps until then.
      const begin = performance.now();
      assert.equal((await show('short_name.gainmodule.yml')).languageId, 'gainmodule');
      await ourExtension().activate();
      say(`a first design is open and its server answers after ${(performance.now() - begin).toFixed(0)} ms`);
      assert.equal((await show(sound)).languageId, 'gainmodule');
      assert.equal(ourExtension().isActive, true);
    },
  },
  {
    name: 'hover on a key and on its value gives what it means and the predicted pulse',
    async run() {
      const document = await show(sound);
      const { start, end } = placeOf(document, 'output_reflectivity: 50 %');
      const onKey = await until('a hover', async () => (await hoverText(document, start)) || undefined);
      assert.match(onKey, /Power reflectivity of the output coupler/);
      assert.match(onKey, /13\.\d mJ/);
      assert.match(onKey, /9\.3\d? ns FWHM/);
      assert.equal(await hoverText(document, end.translate(0, -1)), onKey);
    },
  },
  {
    name: 'hover at the head gives the whole prediction',
    async run() {
      const document = await show(sound);
      const text = await hoverText(document, new Position(1, 2));
      for (const figure of ['Pulse energy', 'Stored energy', 'Optimum reflectivity', 'Average power']) {
        assert.ok(text.includes(figure), `${figure} in ${text}`);
      }
    },
  },
  {
    name: 'the readout opens beside the text, once, and leaves the focus there',
    async run() {
      await show(sound);
      await commands.executeCommand('giantpulse.showReadout');
      const tab = await until('the readout', () => readouts()[0]);
      assert.equal(tab.group.viewColumn, 2);
      assert.equal(window.activeTextEditor?.document.fileName.endsWith(sound), true);
      await commands.executeCommand('giantpulse.showReadout');
      assert.equal(readouts().length, 1);
      await window.tabGroups.close(tab);
      await until('no readout', () => readouts().length === 0 || undefined);
    },
  },
  {
    name: 'problems come back after the server has been restarted',
    async run() {
      const document = await show('unit_forgotten.gainmodule.yaml');
      await until('problems', () => problemsOf(document)[0]);
      let cleared = false;
      const watch = languages.onDidChangeDiagnostics(() => {
        cleared ||= problemsOf(document).length === 0;
      });
      await commands.executeCommand('giantpulse.restartServer');
      await until('problems again', () => (cleared ? problemsOf(document)[0] : undefined));
      watch.dispose();
    },
  },
];
