import { readFileSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import {
  CodeActionRequest,
  CodeLensRequest,
  CompletionRequest,
  DefinitionRequest,
  DidChangeConfigurationNotification,
  DocumentSymbolRequest,
  FoldingRangeRequest,
  HoverRequest,
  InlayHintRequest,
} from 'vscode-languageserver-protocol';
import { isCheckResult, isExplorationState, isExportResult } from '../../extension/protocol/guard.ts';
import { checkRequest, explorationRequest, exportRequest, templateRequest } from '../../extension/protocol/requests.ts';
import { type ServerUnderTest, startServer } from './client.ts';

const design = readFileSync(new URL('../host/workspace/transmitter.gainmodule.yaml', import.meta.url), 'utf8');
const uri = 'file:///bench/transmitter.gainmodule.yaml';
const textDocument = { uri };
const whole = { start: { line: 0, character: 0 }, end: { line: 1000, character: 0 } };

let server: ServerUnderTest;
beforeEach(async () => {
  server = await startServer({ checksUri: 'file:///docs/checks.md' }, true);
});
afterEach(() => {
  server.connection.dispose();
  server.process.kill();
});

function place(text: string, found: string, by = 0) {
  const before = text.slice(0, text.indexOf(found) + by);
  const lines = before.split('\n');
  return { line: lines.length - 1, character: lines.at(-1)?.length ?? 0 };
}

const lens = async () => (await server.connection.sendRequest(CodeLensRequest.type, { textDocument }))?.[0]?.command;
const hints = () => server.connection.sendRequest(InlayHintRequest.type, { textDocument, range: whole });

describe('without VS Code, over the standard streams', () => {
  test('lenses, hints, symbols, folds and definitions', async () => {
    const text = design
      .replace('title:', 'x-mode: &mode { profile: gaussian, radius: 0.9 mm }\ntitle:')
      .replace('beam: { profile: gaussian, radius: 0.9 mm }', 'beam: *mode');
    await server.open(uri, text);
    expect(await lens()).toEqual({ title: expect.stringMatching(/^13\.\d mJ · .* peak · /), command: '' });
    expect(await hints()).toHaveLength(3);
    const symbols = await server.connection.sendRequest(DocumentSymbolRequest.type, { textDocument });
    expect(symbols?.map(({ name }) => name)).toContain('gain_medium');
    expect(await server.connection.sendRequest(FoldingRangeRequest.type, { textDocument })).not.toHaveLength(0);
    const position = place(text, '*mode', 2);
    const found = await server.connection.sendRequest(DefinitionRequest.type, { textDocument, position });
    expect(found).toMatchObject({ uri, range: { start: { line: 1 } } });
  });

  test('completion of half a key', async () => {
    const text = design.replace('  duration: 200 us', '  dur');
    await server.open(uri, text);
    const items = await server.connection.sendRequest(CompletionRequest.type, {
      textDocument,
      position: place(text, '  dur', 5),
    });
    expect(Array.isArray(items) && items[0]).toMatchObject({
      label: 'duration',
      sortText: expect.stringMatching(/^0/),
    });
  });

  test('solved values, the optimum and unit conversions', async () => {
    const text = design.replace('max: 12 ns', 'max: 9 ns');
    await server.open(uri, text);
    const titlesAt = async (found: string, by: number) => {
      const at = place(text, found, by);
      const actions = await server.connection.sendRequest(CodeActionRequest.type, {
        textDocument,
        range: { start: at, end: at },
        context: { diagnostics: [] },
      });
      return (actions ?? []).map(({ title }) => title);
    };
    expect(await titlesAt('max: 9 ns', 5)).toEqual(
      expect.arrayContaining([expect.stringMatching(/^Set pump power to \d+ W: pulse width (8\.9\d|9\.00) ns/)]),
    );
    expect(await titlesAt('output_reflectivity', 24)).toEqual(
      expect.arrayContaining([expect.stringMatching(/^Set output reflectivity to the optimum/), 'Write as 0.5']),
    );
  });

  test('a missed requirement is published at once, and again with the places that it hangs on', async () => {
    await server.open(uri, design.replace('max: 12 ns', 'max: 9 ns'));
    const first = await server.problemsOf(uri, 1);
    expect(first.diagnostics[0]?.relatedInformation).toBeUndefined();
    await expect
      .poll(() => server.published.at(-1)?.diagnostics[0]?.relatedInformation, { timeout: 10_000 })
      .toHaveLength(3);
    const { relatedInformation = [] } = server.published.at(-1)?.diagnostics[0] ?? {};
    expect(relatedInformation[0]).toMatchObject({
      location: { uri },
      message: expect.stringMatching(/^pulse width changes by [+−][\d.]+ % for \+1 % of /),
    });
  });

  test('curves, exports, the check of a text, and a new design', async () => {
    await server.open(uri, design);
    const explored: unknown = await server.connection.sendRequest(explorationRequest, { uri });
    expect(isExplorationState(explored) && explored.charts.map(({ id }) => id)).toEqual([
      'reflectivity',
      'pump',
      'repetition_rate',
    ]);
    const picture: unknown = await server.connection.sendRequest(exportRequest, { uri, what: 'pump', format: 'svg' });
    expect(isExportResult(picture) && picture.text).toMatch(/^<svg /);
    const template: unknown = await server.connection.sendRequest(templateRequest);
    const checked: unknown = await server.connection.sendRequest(checkRequest, {
      file: 'new.gainmodule.yaml',
      text: template,
    });
    expect(isCheckResult(checked) && checked).toEqual({ lines: [], errors: 0, warnings: 0, notes: 0, accepted: 0 });
    for (const junk of [null, 7, {}, { uri: 7 }, { uri: 'file:///nowhere' }]) {
      expect(await server.connection.sendRequest(explorationRequest, junk)).toBeNull();
      expect(await server.connection.sendRequest(exportRequest, junk)).toBeNull();
    }
  });
});

test('settings of the client hold from the start and when they change', async () => {
  await server.open(uri, design);
  const change = (settings: unknown) =>
    server.connection.sendNotification(DidChangeConfigurationNotification.type, { settings });
  await change({ giantpulse: { codeLens: { prediction: false }, inlayHints: { pump: false } } });
  expect(await lens()).toBeUndefined();
  expect(await hints()).toHaveLength(2);
  await change({ giantpulse: 'nonsense' });
  expect(await hints()).toHaveLength(3);
});

describe('an answer is of the version asked about, or none', () => {
  const position = { line: 20, character: 4 };

  test('curves stop when the document changes, and the server answers at once', async () => {
    await server.open(uri, design);
    await server.problemsOf(uri, 1);
    const exploring = server.connection.sendRequest(explorationRequest, { uri });
    await new Promise((resolve) => setTimeout(resolve, 5));
    await server.change(uri, 2, {
      range: { start: { line: 0, character: 0 }, end: { line: 0, character: 0 } },
      text: '# a\n',
    });
    const hovered = server.connection.sendRequest(HoverRequest.type, { textDocument, position });
    const first = await Promise.race([exploring.catch(() => 'curves given up'), hovered.then(() => 'hover')]);
    expect(['curves given up', 'hover']).toContain(first);
    await expect(exploring).rejects.toMatchObject({ code: -32801 });
    await hovered;
  });

  test('of fast typing only the last text is analysed and published', async () => {
    await server.open(uri, design);
    await server.problemsOf(uri, 1);
    const at = place(design, 'length: 180 mm', 'length: 180 mm'.length);
    for (let version = 2; version <= 30; version++) {
      await server.change(uri, version, { range: { start: at, end: at }, text: 'x' });
    }
    const { diagnostics } = await server.problemsOf(uri, 30);
    expect(diagnostics.some(({ message }) => message.includes(`mm${'x'.repeat(29)}`))).toBe(true);
    const versions = server.published.map(({ version }) => version ?? 0);
    expect(versions).toEqual([...versions].sort((a, b) => a - b));
    expect(new Set(versions).size).toBeLessThan(10);
  });
});
