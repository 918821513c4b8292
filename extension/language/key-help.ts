import type { Limit, QuantitySchema, SchemaNode, SectionSchema } from '../core/design/schema.ts';
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

/** The keys of a section that are not written although something holds in their place. */
export function defaultsIn(schema: SectionSchema, isWritten: (key: string) => boolean): readonly string[] {
  return Object.entries(schema.keys).flatMap(([key, { default: standing }]) =>
    standing === undefined || isWritten(key) ? [] : [`\`${key}\`: ${raised(standing)}`],
  );
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
function limits({ limits: all, why }: QuantitySchema): string | undefined {
  const lower = first(all, 'above') ?? first(all, 'at least');
  const upper = first(all, 'below') ?? first(all, 'at most');
  const bounds = [lower, upper].filter((limit) => limit !== undefined);
  if (bounds.length === 0) return undefined;
  const text = bounds.map(({ bound, text }) => `${bound} ${raised(text)}`).join(', ');
  return why === undefined ? text : `${text} (${why})`;
}

function first(limits: readonly Limit[], bound: Limit['bound']): Limit | undefined {
  return limits.find((limit) => limit.bound === bound);
}
