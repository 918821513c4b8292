import { expect, test } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { type Analysis, analyse } from '../../extension/core/analyse.ts';
import { createAnalyses, type VersionedText } from '../../extension/server/analyses.ts';

function bench(analyser: (text: string) => Analysis = analyse) {
  const documents = new Map<string, VersionedText>();
  let calls = 0;
  const analyses = createAnalyses(documents, (text) => {
    calls += 1;
    return analyser(text);
  });
  const put = (version: number, text: string): void => {
    documents.set('a', TextDocument.create('a', 'gainmodule', version, text));
  };
  return { analyses, documents, put, calls: () => calls };
}

test('a version is analysed once, however often it is asked for', () => {
  const { analyses, put, calls } = bench();
  put(1, 'format: 1');
  expect(analyses.of('a')).toBe(analyses.of('a'));
  expect(calls()).toBe(1);
});

test('a new version is analysed anew, also when a reopened document counts from 1 again', () => {
  const { analyses, put, calls } = bench();
  put(1, 'format: 1');
  analyses.of('a');
  put(2, 'format: 2');
  expect(analyses.of('a')).toMatchObject({ version: 2 });
  put(2, 'format: 3');
  analyses.of('a');
  expect(calls()).toBe(3);
});

test('what is not open has no analysis', () => {
  const { analyses, documents, put } = bench();
  put(1, 'format: 1');
  analyses.of('a');
  documents.delete('a');
  expect(analyses.of('a')).toBeUndefined();
});

test('a fault in the analysis is kept as a failure of that version, not thrown', () => {
  const { analyses, put } = bench((text) => {
    if (text === 'fault') throw new Error('divided by a mirror');
    return analyse(text);
  });
  put(1, 'fault');
  expect(analyses.of('a')).toMatchObject({ version: 1, failure: 'divided by a mirror' });
  put(2, 'format: 1');
  expect(analyses.of('a')).toHaveProperty('analysis');
});
