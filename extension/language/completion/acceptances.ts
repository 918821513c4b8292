import { isAcceptable } from '../../core/checks/acceptance.ts';
import type { Subject } from '../subject.ts';
import type { Offer } from './keys.ts';

/** A comment up to the cursor that begins to accept something: `# accept ho`. */
const BEGUN = /(?:^|[ \t])#[ \t]*accept[ \t]+([a-z-]*)$/;

export interface BegunAcceptance {
  readonly typed: string;
  readonly offers: readonly Offer[];
}

/** Codes of what is found on this line or the next that is no comment; undefined where no acceptance is begun. */
export function acceptanceOffers({ text, analysis }: Subject, offset: number): BegunAcceptance | undefined {
  const lineStart = text.lastIndexOf('\n', offset - 1) + 1;
  const typed = BEGUN.exec(text.slice(lineStart, offset))?.[1];
  if (typed === undefined) return undefined;
  let from = lineStart;
  while (/^[ \t]*#/.test(text.slice(from, from + 200)) && text.indexOf('\n', from) >= 0)
    from = text.indexOf('\n', from) + 1;
  const end = text.indexOf('\n', from);
  const to = end < 0 ? text.length : end;
  const here = analysis.problems.filter(
    ({ range, code }) => range.start >= from && range.start <= to && isAcceptable(code),
  );
  const codes = [...new Map(here.map(({ code, message }) => [code, message]))];
  const offers = codes.map(
    ([code, message], index): Offer => ({
      label: code,
      kind: 20,
      detail: message,
      sortText: String(index),
      text: `${code}: `,
    }),
  );
  return { typed, offers };
}
