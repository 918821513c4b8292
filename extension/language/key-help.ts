import type { Limit, QuantitySchema, SchemaNode } from '../core/design/schema.ts';
import { raised } from './show.ts';

/** What the schema says of a key, as lines of Markdown. */
export function keyHelp(schema: SchemaNode): readonly string[] {
  const allowed = allowedValues(schema);
  return [
    schema.description,
    ...(allowed === undefined ? [] : [`Allowed: ${allowed}.`]),
    ...(schema.kind === 'quantity' && schema.usual !== undefined
      ? [`Usual: ${raised(schema.usual.low.text)} to ${raised(schema.usual.high.text)}.`]
      : []),
    ...(schema.default === undefined ? [] : [`If left out: ${raised(schema.default)}.`]),
  ];
}

function allowedValues(schema: SchemaNode): string | undefined {
  switch (schema.kind) {
    case 'choice':
      return schema.allowed.map((value) => `\`${value}\``).join(', ');
    case 'count':
      return `${schema.least} to ${schema.most}`;
    case 'quantity':
      return limits(schema);
    case 'section':
    case 'list':
    case 'text':
      return undefined;
  }
}

/** The narrowest bound on either side: of `above 0` and `at least 1e-7`, a person needs the first. */
function limits({ limits: all }: QuantitySchema): string | undefined {
  const bounds = [first(all, 'above') ?? first(all, 'at least'), first(all, 'below') ?? first(all, 'at most')];
  const known = bounds.filter((limit) => limit !== undefined);
  if (known.length === 0) return undefined;
  const [why] = known.flatMap(({ why: reason }) => (reason === undefined ? [] : [` (${reason})`]));
  return `${known.map(({ bound, text }) => `${bound} ${raised(text)}`).join(', ')}${why ?? ''}`;
}

function first(limits: readonly Limit[], bound: Limit['bound']): Limit | undefined {
  return limits.find((limit) => limit.bound === bound);
}
