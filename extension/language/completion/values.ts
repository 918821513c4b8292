import type { QuantitySchema, SchemaNode } from '../../core/design/schema.ts';
import { DIMENSIONS } from '../../core/quantity/dimension.ts';
import { readQuantity } from '../../core/quantity/quantity.ts';
import { raised } from '../show.ts';
import type { Cursor } from './cursor.ts';
import type { Offer } from './keys.ts';

/** LSP's numbers: 11 unit, 12 value, 20 enum member. */
const kinds = { unit: 11, value: 12, choice: 20 } as const;

/** A value worth offering at a place, and why. */
export interface Known {
  readonly text: string;
  readonly detail: string;
  readonly documentation?: string;
}

/** Values for a key: what is known for it first, then the schema's examples and usual range, or units for a typed number. */
export function valueOffers({ typed }: Cursor, schema: SchemaNode, known: readonly Known[]): Offer[] {
  switch (schema.kind) {
    case 'choice':
      return schema.allowed.map((value, index) => offer(String(value), 'one of those allowed', index, kinds.choice));
    case 'quantity':
      return NUMBER.test(typed) ? unitOffers(typed, schema) : numbered([...known, ...schemaValues(schema)]);
    case 'text':
    case 'count':
      return numbered([...known, ...(schema.examples ?? []).map((text) => ({ text, detail: 'example' }))]);
    case 'section':
    case 'list':
      return [];
  }
}

/** A number, the blanks behind it, and the beginning of a unit. */
const NUMBER = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)([ \t]*)([^\d\s±].*)?$/;

/** The typed number with every unit that fits, the likeliest first. */
function unitOffers(typed: string, { dimension }: QuantitySchema): Offer[] {
  const [, number = '', gap = ''] = NUMBER.exec(typed) ?? [];
  return DIMENSIONS[dimension].units.flatMap((unit, index) => {
    const text = `${number} ${unit}`;
    if ('problem' in readQuantity(text, dimension)) return [];
    return [
      {
        ...offer(text, DIMENSIONS[dimension].noun.replace(/^an? /, ''), index, kinds.unit),
        filterText: `${number}${gap}${unit}`,
      },
    ];
  });
}

function schemaValues({ examples = [], usual, default: fallback, dimension }: QuantitySchema): Known[] {
  const isQuantity = (text: string | undefined): text is string =>
    text !== undefined && !('problem' in readQuantity(text, dimension));
  return [
    ...examples.map((text) => ({ text, detail: 'example' })),
    ...(isQuantity(fallback) ? [{ text: fallback, detail: 'what holds if it is left out' }] : []),
    ...(usual === undefined
      ? []
      : [
          { text: usual.low.text, detail: 'least that is usual' },
          { text: usual.high.text, detail: 'most that is usual' },
        ]),
  ];
}

function numbered(known: readonly Known[]): Offer[] {
  const seen = new Set<string>();
  return known.flatMap(({ text, detail, documentation }, index): Offer[] => {
    if (seen.has(text)) return [];
    seen.add(text);
    const made = offer(text, detail, index, kinds.value);
    return [
      documentation === undefined ? made : { ...made, documentation: { kind: 'markdown', value: documentation } },
    ];
  });
}

function offer(text: string, detail: string, index: number, kind: Offer['kind']): Offer {
  return { label: text, ...(kind && { kind }), detail: raised(detail), sortText: String(index).padStart(3, '0'), text };
}
