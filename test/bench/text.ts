import { LineCounter, parseDocument } from 'yaml';
import { analyse } from '../../extension/core/analyse.ts';
import { readDesign } from '../../extension/core/design/read.ts';
import { longDesign } from './long-design.ts';
import { inTurn } from './stopwatch.ts';
import { type Row, time } from './table.ts';

/** `analyse` against what a tool that needs places would call of `yaml`; and of it, the reading alone. */
export function textToProblems(): Row[] {
  const text = longDesign();
  const errors = analyse(text).problems.filter(({ severity }) => severity === 'error');
  if (errors.length > 0 || !analyse(text).prediction?.pulse) throw new Error(`invalid: ${errors[0]?.message}`);
  const parse = () => parseDocument(text, { keepSourceTokens: true, lineCounter: new LineCounter() });
  const times = inTurn([() => analyse(text), () => readDesign(text), () => parseDocument(text), parse], 4);
  const [all = Number.NaN, read = Number.NaN, plain = Number.NaN, placed = Number.NaN] = times;
  const target = { most: 1.5 };
  const lines = text.split('\n').length - 1;
  return [
    { what: `${lines} lines; yaml with its defaults`, ours: time(all), other: time(plain), ratio: all / plain, target },
    { what: '  yaml keeping tokens and lines', ours: time(all), other: time(placed), ratio: all / placed, target },
    { what: '  reading alone, no prediction', ours: time(read), other: time(plain), ratio: read / plain, target },
  ];
}
