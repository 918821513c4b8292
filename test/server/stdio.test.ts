import { readFileSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { CodeActionRequest, HoverRequest, type MarkupContent } from 'vscode-languageserver-protocol';
import { isReadoutState } from '../../extension/protocol/guard.ts';
import { analysedNotification, readoutRequest } from '../../extension/protocol/requests.ts';
import { type ServerUnderTest, startServer } from './client.ts';

const design = readFileSync(new URL('../host/workspace/transmitter.gainmodule.yaml', import.meta.url), 'utf8');
const uri = 'file:///bench/transmitter.gainmodule.yaml';
const lines = design.split('\n');

/** The place of a piece of text in the design. */
function placeOf(text: string): {
  start: { line: number; character: number };
  end: { line: number; character: number };
} {
  const line = lines.findIndex((content) => content.includes(text));
  const character = lines[line]?.indexOf(text) ?? -1;
  return { start: { line, character }, end: { line, character: character + text.length } };
}

let server: ServerUnderTest;
beforeEach(async () => {
  server = await startServer({ checksUri: 'file:///docs/checks.md' }, true);
});
afterEach(() => {
  server.connection.dispose();
  server.process.kill();
});

async function hoverAt(text: string): Promise<string> {
  const position = placeOf(text).start;
  const hover = await server.connection.sendRequest(HoverRequest.type, { textDocument: { uri }, position });
  const contents: unknown = hover?.contents;
  const isMarkup = (value: unknown): value is MarkupContent =>
    typeof value === 'object' && value !== null && 'kind' in value;
  if (!isMarkup(contents)) throw new Error(`no Markdown at ${text}`);
  return contents.value;
}

describe('problems', () => {
  test('a sound design has no error', async () => {
    await server.open(uri, design);
    const { diagnostics } = await server.problemsOf(uri, 1);
    expect(diagnostics.filter(({ severity }) => severity === 1)).toEqual([]);
  });

  test('a problem has its code, a link to its section, and the range of the value', async () => {
    await server.open(uri, design.replace('length: 60 mm', 'length: 60'));
    const { diagnostics } = await server.problemsOf(uri, 1);
    const { start } = placeOf('60 mm');
    expect(diagnostics).toContainEqual(
      expect.objectContaining({
        code: 'missing-unit',
        codeDescription: { href: 'file:///docs/checks.md#missing-unit' },
        severity: 1,
        source: 'Giant Pulse',
        range: { start, end: { ...start, character: start.character + 2 } },
      }),
    );
  });

  test('an incremental edit brings a problem and another takes it away', async () => {
    const { start, end } = placeOf(' mm');
    await server.open(uri, design);
    await server.problemsOf(uri, 1);
    await server.change(uri, 2, { range: { start, end }, text: '' });
    expect((await server.problemsOf(uri, 2)).diagnostics.map(({ code }) => code)).toContain('missing-unit');
    await server.change(uri, 3, { range: { start, end: start }, text: ' mm' });
    expect((await server.problemsOf(uri, 3)).diagnostics.filter(({ severity }) => severity === 1)).toEqual([]);
  });

  test('of a burst of edits only the last version is published', async () => {
    const { start } = placeOf(' mm');
    await server.open(uri, design);
    await server.problemsOf(uri, 1);
    for (let version = 2; version <= 12; version++) {
      await server.change(uri, version, { range: { start, end: start }, text: '0' });
    }
    await server.problemsOf(uri, 12);
    expect(server.published.filter((params) => params.uri === uri).map(({ version }) => version)).toEqual([1, 12]);
  });

  test('closing a document clears its problems, and nothing is published for it afterwards', async () => {
    await server.open(uri, design.replace('length: 60 mm', 'length: 60'));
    await server.problemsOf(uri, 1);
    await server.change(uri, 2, { range: placeOf(' mm'), text: '' });
    await server.close(uri);
    await new Promise((resolve) => setTimeout(resolve, 300));
    expect(server.published.at(-1)).toEqual({ uri, diagnostics: [] });
    expect(server.published.some(({ version }) => version === 2)).toBe(false);
  });
});

test('hover on a key and on its value tells the same, with the predicted pulse', async () => {
  await server.open(uri, design);
  const onKey = await hoverAt('output_reflectivity');
  expect(onKey).toMatch(/Power reflectivity of the output coupler/);
  expect(onKey).toMatch(/13\.\d mJ/);
  expect(await hoverAt('50 %')).toBe(onKey);
});

test('a hover right after an edit speaks of the edited text, not of the analysis before it', async () => {
  await server.open(uri, design);
  await server.problemsOf(uri, 1);
  const before = await hoverAt('output_reflectivity');
  await server.change(uri, 2, { range: placeOf('50 %'), text: '70 %' });
  const after = await hoverAt('output_reflectivity');
  expect(before).toContain('50 %');
  expect(after).toContain('70 %');
});

test('the fix of a missing unit edits only the value', async () => {
  await server.open(uri, design.replace('length: 60 mm', 'length: 60'));
  await server.problemsOf(uri, 1);
  const { start } = placeOf('60 mm');
  const actions = await server.connection.sendRequest(CodeActionRequest.type, {
    textDocument: { uri },
    range: { start, end: start },
    context: { diagnostics: [] },
  });
  const millimetres = (actions ?? []).find(({ title }) => /\bmm\b/.test(title));
  expect(millimetres).toMatchObject({ kind: 'quickfix', diagnostics: [{ code: 'missing-unit' }] });
  const edits = millimetres !== undefined && 'edit' in millimetres ? millimetres.edit?.changes?.[uri] : undefined;
  expect(edits).toHaveLength(1);
  expect(edits?.[0]?.range.start.line).toBe(start.line);
});

describe('the readout', () => {
  test('comes with figures, a waveform in display units and the version it is of', async () => {
    const analysed = new Promise((resolve) => server.connection.onNotification(analysedNotification, resolve));
    await server.open(uri, design, 7);
    expect(await analysed).toEqual({
      uri,
      version: 7,
      headline: expect.stringMatching(/^13\.\d mJ · 9\.\d+ ns/),
      errors: 0,
      warnings: 0,
    });
    const state: unknown = await server.connection.sendRequest(readoutRequest, { uri });
    if (!isReadoutState(state)) throw new Error('not a state');
    expect(state).toMatchObject({ uri, version: 7, title: 'Hail-sounding lidar transmitter' });
    expect(state.headline[0]).toMatchObject({ label: 'Pulse energy', value: expect.stringMatching(/^13\.\d mJ$/) });
    const [waveform] = state.charts;
    if (waveform?.kind !== 'lines') throw new Error('no waveform');
    expect([waveform.x.unit, waveform.left.unit]).toEqual(['ns', 'MW']);
    expect(Math.max(...(waveform.lines[0]?.values ?? []))).toBeCloseTo(1.22, 1);
  });

  test('keeps its headline and says why there is no pulse', async () => {
    await server.open(uri, design.replace('length: 60 mm', 'length: 60'));
    const state: unknown = await server.connection.sendRequest(readoutRequest, { uri });
    if (!isReadoutState(state)) throw new Error('not a state');
    expect(state.absence).toMatch(/No pulse is predicted/);
    expect(state.charts).toEqual([]);
    expect(state.headline.map(({ value }) => value)).toEqual([undefined, undefined, undefined, undefined]);
  });

  test('of a document that is not open, or for nonsense, is null', async () => {
    expect(await server.connection.sendRequest(readoutRequest, { uri })).toBeNull();
    expect(await server.connection.sendRequest(readoutRequest, { document: 1 })).toBeNull();
  });
});

describe('the end', () => {
  test('shutdown and exit end the process cleanly', async () => {
    await server.open(uri, design);
    await server.connection.sendRequest('shutdown');
    await server.connection.sendNotification('exit');
    expect(await server.exitCode).toBe(0);
  });

  test('a client that vanishes takes the server with it', async () => {
    server.process.stdin.end();
    expect(await server.exitCode).not.toBeNull();
  });
});
