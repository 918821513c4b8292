import type { CodeLens } from 'vscode-languageserver-protocol';
import type { Analysis } from '../core/analyse.ts';
import { tightestMargin } from '../core/explore/margins.ts';
import { oneLine, shortened } from './one-line.ts';
import { show } from './show.ts';
import type { Subject } from './subject.ts';

const LONGEST_NAME = 32;
const LONGEST_REASON = 120;

/**
 * One lens on the first line, for any text: the predicted pulse, or why there is none. It never comes or goes, so that the
 * text under it never jumps. `readoutCommand`: the client's command that it runs; without one it is only read.
 */
export function codeLenses({ analysis, toRange }: Subject, readoutCommand: string | undefined): CodeLens[] {
  const lineOf = (offset: number): number => toRange({ start: offset, end: offset }).start.line + 1;
  const title = pulseLine(analysis) ?? absenceLine(analysis, lineOf);
  const start = { line: 0, character: 0 };
  return [{ range: { start, end: start }, command: { title, command: readoutCommand ?? '' } }];
}

/** `13.1 mJ · 9.37 ns · 1.22 MW peak · 262 mW average · margin 2.51 × on rod`; undefined without a pulse. */
function pulseLine({ prediction, outcome }: Analysis): string | undefined {
  const pulse = prediction?.pulse;
  if (pulse === undefined || outcome === undefined) return undefined;
  const average = show(prediction?.train.average_power_W, 'power');
  const tightest = tightestMargin(outcome);
  return [
    show(pulse.energy_J, 'energy'),
    show(pulse.width_fwhm_s, 'time'),
    `${show(pulse.peak_power_W, 'power')} peak`,
    ...(average === undefined ? [] : [`${average} average`]),
    ...(tightest === undefined ? [] : [`margin ${show(tightest.value, 'ratio')} × ${placed(tightest)}`]),
  ].join(' · ');
}

function placed({ kind, name }: { readonly kind: string; readonly name: string }): string {
  return kind === 'damage' ? `on ${shortened(oneLine(name), LONGEST_NAME)}` : 'of hold-off';
}

/** Why there is no pulse, in the space of one line: the first error's first sentence, and where it is. */
function absenceLine({ problems }: Analysis, lineOf: (offset: number) => number): string {
  const errors = problems.filter(({ severity }) => severity === 'error');
  const [first] = errors;
  if (first === undefined) return 'No pulse predicted';
  const message = oneLine(first.message.replaceAll('`', ''));
  const sentence = /^.*?[.?](?= |$)/.exec(message)?.[0] ?? message;
  const told = shortened(sentence.replace(/\.$/, ''), LONGEST_REASON);
  const more = errors.length === 1 ? '' : `, and ${errors.length - 1} more`;
  const opening = told.startsWith('No pulse') ? '' : 'No pulse predicted: ';
  return `${opening}${told} (line ${lineOf(first.range.start)}${more})`;
}
