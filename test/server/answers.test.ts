import { describe, expect, test } from 'vitest';
import { CancellationTokenSource } from 'vscode-languageserver/node';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { analyse } from '../../extension/core/analyse.ts';
import { createAnalyses } from '../../extension/server/analyses.ts';
import { createAnswers, pause } from '../../extension/server/answers.ts';
import { createDeepener } from '../../extension/server/deepening.ts';
import { demo } from '../explore/designs.ts';

const uri = 'file:///a.gainmodule.yaml';
const none = new CancellationTokenSource().token;

function bench(text = demo) {
  let document = TextDocument.create(uri, 'gainmodule', 1, text);
  let analysed = 0;
  const documents = { get: (wanted: string) => (wanted === uri ? document : undefined) };
  const analyses = createAnalyses(documents, (given) => {
    analysed += 1;
    return analyse(given);
  });
  return {
    analyses,
    answers: createAnswers(analyses, (wanted) => documents.get(wanted)?.version),
    type: () => {
      const start = { line: 0, character: 0 };
      document = TextDocument.update(document, [{ range: { start, end: start }, text: '#\n' }], document.version + 1);
    },
    version: () => document.version,
    analysed: () => analysed,
  };
}

describe('an answer', () => {
  test('is of the version asked about', async () => {
    const { answers } = bench();
    const answer = answers.about((subject) => subject.version, 0);
    expect(await answer({ textDocument: { uri } }, none)).toBe(1);
  });

  test('is refused where a change comes before it is begun, and nothing is analysed for it', async () => {
    const { answers, type, analysed } = bench();
    const asked = answers.about(({ version }) => version, 0)({ textDocument: { uri } }, none);
    type();
    await expect(asked).rejects.toMatchObject({ code: -32801 });
    expect(analysed()).toBe(0);
  });

  test('is refused where a change comes while it is worked out', async () => {
    const { answers, type } = bench();
    const slow = answers.about(async ({ version }) => {
      await pause();
      type();
      return version;
    }, 0);
    await expect(slow({ textDocument: { uri } }, none)).rejects.toMatchObject({ code: -32801 });
  });

  test('is not worked out once it is cancelled', async () => {
    const { answers, analysed } = bench();
    const source = new CancellationTokenSource();
    const asked = answers.about(({ version }) => version, 0)({ textDocument: { uri } }, source.token);
    source.cancel();
    await expect(asked).rejects.toMatchObject({ code: -32800 });
    expect(analysed()).toBe(0);
  });

  test('is the empty one for what is not open', async () => {
    const { answers } = bench();
    expect(await answers.about(({ version }) => version, -1)({ textDocument: { uri: 'file:///b' } }, none)).toBe(-1);
  });
});

describe('deepening', () => {
  const until = async (isDone: () => boolean) => {
    for (let turn = 0; turn < 2000 && !isDone(); turn++) await pause();
  };
  const subjectOf = (text: string) => {
    const { analyses } = bench(text);
    const subject = analyses.of(uri);
    if (subject === undefined || 'failure' in subject) throw new Error('no subject');
    return subject;
  };

  test('remembers what lies beside every value of a current version', async () => {
    const subject = subjectOf(demo);
    let done = 0;
    createDeepener(
      () => true,
      () => done++,
    ).deepen(subject);
    await until(() => done > 0);
    expect(done).toBe(1);
    const begin = subject.explorer.around('pump.power');
    expect(subject.explorer.around('pump.power')).toBe(begin);
  });

  test('gives a version up that has passed, and takes the latest first', async () => {
    const subjects = Array.from({ length: 40 }, () => subjectOf(demo));
    const order: number[] = [];
    const deepener = createDeepener(
      (subject) => subject !== subjects[39],
      (subject) => order.push(subjects.indexOf(subject)),
    );
    for (const subject of subjects) deepener.deepen(subject);
    await until(() => order.length >= 16);
    // The first was begun at once; of the rest the sixteen latest wait, but for the one that has passed.
    expect(order).toEqual([0, 38, 37, 36, 35, 34, 33, 32, 31, 30, 29, 28, 27, 26, 25, 24]);
  });
});
