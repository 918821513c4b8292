import type { DimensionName } from '../quantity/dimension.ts';

/** One place of the design file as `gain-module.schema.json` describes it; `generated/schema.ts` holds the whole tree. */
export type SchemaNode = SectionSchema | ListSchema | QuantitySchema | ChoiceSchema | TextSchema | CountSchema;

interface Described {
  readonly description: string;
  /** What holds where the key is absent, in words or as a quantity; without it the key is required or merely optional. */
  readonly default?: string;
  readonly examples?: readonly string[];
}

export interface SectionSchema extends Described {
  readonly kind: 'section';
  readonly keys: Readonly<Record<string, SchemaNode>>;
  readonly required: readonly string[];
  /** Two quantities of which `lower` must not exceed (`strict`: must be below) `upper`. */
  readonly order?: {
    readonly lower: string;
    readonly upper: string;
    readonly strict: boolean;
    readonly because: string;
  };
}

export interface ListSchema extends Described {
  readonly kind: 'list';
  readonly item: SectionSchema;
}

export interface QuantitySchema extends Described {
  readonly kind: 'quantity';
  readonly dimension: DimensionName;
  readonly limits: readonly Limit[];
  readonly usual?: { readonly low: Bound; readonly high: Bound; readonly why?: string };
}

export interface ChoiceSchema extends Described {
  readonly kind: 'choice';
  readonly allowed: readonly (string | number)[];
}

export interface TextSchema extends Described {
  readonly kind: 'text';
}

export interface CountSchema extends Described {
  readonly kind: 'count';
  readonly least: number;
  readonly most: number;
}

export interface Bound {
  readonly text: string;
  /** SI. */
  readonly value: number;
}

export interface Limit extends Bound {
  readonly bound: 'above' | 'at least' | 'below' | 'at most';
  /** The end of a sentence; absent where the limit only keeps slips of the pen out. */
  readonly why?: string;
}

/** A rule that holds because another key says so, by the path of its `x-because` in the schema. */
export interface Condition {
  readonly because: string;
  /** The key whose value demands it; absent where the section as a whole does. */
  readonly blame?: string;
}

/** The schema of a key, also for names such as `constructor` that every object answers to. */
export function keySchema(schema: SchemaNode | undefined, key: string): SchemaNode | undefined {
  return schema?.kind === 'section' && Object.hasOwn(schema.keys, key) ? schema.keys[key] : undefined;
}
