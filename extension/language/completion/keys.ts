import type { CompletionItem } from 'vscode-languageserver-protocol';
import { exampleText } from '../../core/design/fill.ts';
import type { SchemaNode, SectionSchema } from '../../core/design/schema.ts';
import { sectionRules } from '../../core/design/section-rules.ts';
import { DIMENSIONS } from '../../core/quantity/dimension.ts';
import { keyHelp } from '../key-help.ts';
import { raised } from '../show.ts';
import type { Cursor } from './cursor.ts';

/** LSP's numbers: 10 property, 9 module. */
const kinds = { value: 10, section: 9 } as const;

/** What stands in a completion's place besides its own text. */
export type Offer = Pick<CompletionItem, 'label' | 'kind' | 'detail' | 'documentation' | 'sortText' | 'filterText'> & {
  readonly text: string;
};

/** Keys that the section may still take: those that it can't do without first, each in the schema's order. */
export function keyOffers(
  { section, siblings, indent, flow }: Cursor,
  schema: SectionSchema,
  hasColon: boolean,
): Offer[] {
  const rules = sectionRules(section, plainData(siblings));
  const order = Object.keys(schema.keys);
  return order.flatMap((key, index): Offer[] => {
    const inner = schema.keys[key];
    if (inner === undefined || Object.hasOwn(siblings, key) || rules.excludes(key)) return [];
    const isMissing = rules.missing.includes(key);
    return [
      {
        label: key,
        kind: inner.kind === 'section' || inner.kind === 'list' ? kinds.section : kinds.value,
        detail: `${isMissing ? 'missing; ' : ''}${detailOf(inner)}`,
        documentation: { kind: 'markdown', value: keyHelp(inner).join('\n\n') },
        sortText: `${isMissing ? 0 : 1}${String(index).padStart(3, '0')}`,
        text: hasColon ? key : keyText(section, key, inner, flow ? undefined : indent),
      },
    ];
  });
}

/** A section comes with its required keys and examples for them, any other key with room for its value. */
function keyText(section: string, key: string, schema: SchemaNode, indent: string | undefined): string {
  if (schema.kind === 'section') return exampleText(section, key, schema, indent) ?? `${key}: `;
  if (schema.kind === 'list') {
    const [first = 'name'] = schema.item.required;
    return indent === undefined ? `${key}: [ { ${first}:  } ]` : `${key}:\n${indent}  - ${first}: `;
  }
  return `${key}: `;
}

function detailOf(schema: SchemaNode): string {
  switch (schema.kind) {
    case 'quantity': {
      const { usual, dimension } = schema;
      const noun = DIMENSIONS[dimension].noun.replace(/^an? /, '');
      return usual === undefined ? noun : `${noun}, usually ${raised(usual.low.text)} to ${raised(usual.high.text)}`;
    }
    case 'choice':
      return schema.allowed.join(' | ');
    case 'count':
      return 'whole number';
    case 'text':
      return 'text';
    case 'section':
      return 'section';
    case 'list':
      return 'list';
  }
}

/** Numbers as the validator wants them where the schema asks for whole ones. */
export function plainData(siblings: Readonly<Record<string, string>>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(siblings).map(([key, value]) => [key, /^\d+$/.test(value) ? Number(value) : value]),
  );
}
