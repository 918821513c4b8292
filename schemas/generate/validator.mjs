// The schema as plain code: ajv at build time, nothing of it at run time.
import { Ajv2020 } from 'ajv/dist/2020.js';
import standalone from 'ajv/dist/standalone/index.js';
import { build } from 'esbuild';

/** Keywords of ours. They say what ajv can't check; naming each lets strict mode catch a misspelt one. */
export const OWN_KEYWORDS = [
  'x-dimension',
  'x-text',
  'x-above',
  'x-at-least',
  'x-below',
  'x-at-most',
  'x-usual',
  'x-unusual',
  'x-default',
  'x-why',
  'x-because',
  'x-order',
];

export const AJV_OPTIONS = {
  allErrors: true,
  strict: true,
  allowUnionTypes: true,
  strictTypes: false,
  strictRequired: false,
  inlineRefs: false,
};

const DECLARATION = `/** One rule that a value breaks. */
export interface ValidationError {
  readonly keyword: string;
  /** JSON pointer to the value. */
  readonly instancePath: string;
  /** JSON pointer to the rule. */
  readonly schemaPath: string;
  readonly params: { readonly additionalProperty?: string; readonly missingProperty?: string };
}

/** Whether a value has the shape of a gain module; \`errors\` is that of the last call. */
declare const validate: {
  (value: unknown): boolean;
  errors?: readonly ValidationError[] | null;
};
export default validate;
`;

export async function validatorOf(schema) {
  const ajv = new Ajv2020({ ...AJV_OPTIONS, messages: false, code: { source: true, esm: true, lines: true } });
  ajv.addVocabulary(OWN_KEYWORDS);
  const source = standalone.default(ajv, ajv.compile(withoutNotes(schema)));
  const bundle = await build({
    stdin: { contents: source, resolveDir: import.meta.dirname ?? process.cwd(), loader: 'js' },
    bundle: true,
    format: 'esm',
    write: false,
    legalComments: 'none',
    target: 'es2022',
    minify: true,
    logLevel: 'error',
  });
  const code = bundle.outputFiles[0].text.replace(/^\/\/ .*\n/gm, '');
  return {
    'validate.js': `// Generated from schemas/gain-module.schema.json; see schemas/generate.mjs.\n${code}`,
    'validate.d.ts': DECLARATION,
  };
}

/** The standalone code carries the schemas it refers to; words only people read stay out of it. */
function withoutNotes(node) {
  if (Array.isArray(node)) return node.map(withoutNotes);
  if (typeof node !== 'object' || node === null) return node;
  const kept = Object.entries(node).filter(
    ([key, value]) =>
      !OWN_KEYWORDS.includes(key) && !(key === 'description' && typeof value === 'string') && key !== 'examples',
  );
  return Object.fromEntries(kept.map(([key, value]) => [key, withoutNotes(value)]));
}
