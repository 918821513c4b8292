import type { CompletionItem } from 'vscode-languageserver-protocol';
import { keySchema } from '../../core/design/schema.ts';
import type { TextRange } from '../../core/report/problem.ts';
import type { Subject } from '../subject.ts';
import { acceptanceOffers } from './acceptances.ts';
import { cursorAt } from './cursor.ts';
import { keyOffers, type Offer } from './keys.ts';
import { knownValues } from './known-values.ts';
import { valueOffers } from './values.ts';

/** What can be written at an offset: keys, values or codes to accept. Works from the lines around it, however broken. */
export function completion(subject: Subject, offset: number): CompletionItem[] {
  const { text, analysis } = subject;
  const begun = acceptanceOffers(subject, offset);
  if (begun !== undefined) return items(subject, begun.offers, { start: offset - begun.typed.length, end: offset });
  const cursor = cursorAt(text, offset);
  if (cursor === undefined) return [];
  const section = analysis.design.schemaOf(cursor.section);
  const range = { start: cursor.start, end: cursor.end };
  if (cursor.key !== undefined) {
    const schema = keySchema(section, cursor.key);
    if (schema === undefined) return [];
    const offers = valueOffers(cursor, schema, knownValues(analysis, cursor));
    // Behind a colon a blank is wanted: `length:|` becomes `length: 60 mm`.
    const glued = text[cursor.start - 1] === ':' ? ' ' : '';
    return items(subject, offers, range, glued);
  }
  if (section?.kind === 'list' && cursor.inList && !cursor.flow) {
    const item = section.item;
    const [first = 'name'] = item.required;
    return items(subject, [{ label: `- ${first}`, kind: 9, detail: item.description, text: `- ${first}: ` }], range);
  }
  if (section?.kind !== 'section') return [];
  const hasColon = /^[ \t]*:(?:\s|$)/.test(text.slice(cursor.end, cursor.end + 20));
  return items(subject, keyOffers(cursor, section, hasColon), range);
}

function items({ toRange }: Subject, offers: readonly Offer[], range: TextRange, before = ''): CompletionItem[] {
  const place = toRange(range);
  return offers.map(({ text, ...rest }) => ({ ...rest, textEdit: { range: place, newText: `${before}${text}` } }));
}
