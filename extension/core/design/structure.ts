import { fillingFix, valueFix } from './fill.ts';
import type { Findings } from './finding.ts';
import { CONDITIONS } from './generated/schema.ts';
import validate, { type ValidationError } from './generated/validate.js';
import { type Condition, keySchema, type SchemaNode } from './schema.ts';
import { nearest } from './suggest.ts';
import type { TreeNode } from './tree.ts';
import { reportUnknownKey } from './unknown-keys.ts';
import { clip, describeWrongType, exampleOf, listed, placeName } from './wording.ts';

/** A broken rule with the value it concerns. */
interface Fault {
  readonly error: ValidationError;
  readonly node: TreeNode;
  readonly schema: SchemaNode | undefined;
  /** Whether its section can't do without it. */
  readonly required: boolean;
}

/**
 * Reports where a design departs from the schema's shape. `partial`: the text has syntax errors, so that what is
 * missing may only be unread.
 */
export function checkStructure(
  text: string,
  root: TreeNode,
  schema: SchemaNode,
  partial: boolean,
  findings: Findings,
): void {
  if (validate(root.data)) return;
  const faults = (validate.errors ?? []).flatMap((error) => locate(error, root, schema));
  const misspelt = new Set<string>();
  for (const { error, node, schema: section } of faults) {
    if (error.keyword !== 'additionalProperties') continue;
    const meant = reportUnknownKey(node, error.params.additionalProperty ?? '', section, schema, findings);
    // Then the key meant is not missing as well.
    if (meant !== undefined) misspelt.add(`${node.path} ${meant}`);
  }
  for (const fault of faults) {
    if (fault.node.kind === 'broken') continue;
    report({ text, partial, misspelt, findings }, fault);
  }
}

interface Reading {
  readonly text: string;
  readonly partial: boolean;
  readonly misspelt: ReadonlySet<string>;
  readonly findings: Findings;
}

function locate(error: ValidationError, root: TreeNode, schema: SchemaNode): Fault[] {
  let node: TreeNode | undefined = root;
  let part: SchemaNode | undefined = schema;
  let required = true;
  for (const token of error.instancePath.split('/').slice(1)) {
    const key = token.replaceAll('~1', '/').replaceAll('~0', '~');
    node = node?.items?.[Number(key)] ?? node?.entries?.get(key);
    required = part?.kind === 'section' && part.required.includes(key);
    part = part?.kind === 'list' ? part.item : keySchema(part, key);
  }
  return node === undefined ? [] : [{ error, node, schema: part, required }];
}

function report(reading: Reading, fault: Fault): void {
  const { findings } = reading;
  switch (fault.error.keyword) {
    case 'required':
      if (!reading.partial) reportMissing(reading, fault);
      break;
    case 'minProperties':
      reportEmpty(fault, findings);
      break;
    case 'not':
      reportExcluded(fault, findings);
      break;
    case 'enum':
    case 'const':
      if (fault.node.kind === 'scalar') reportChoice(fault, findings);
      else reportType(reading, fault);
      break;
    case 'type':
      reportType(reading, fault);
      break;
    case 'minimum':
    case 'maximum':
      reportCount(fault, findings);
      break;
  }
}

function conditionOf({ error }: Fault): Condition | undefined {
  return CONDITIONS[error.schemaPath.slice(0, error.schemaPath.lastIndexOf('/'))];
}

/** On the value that demands the key, if one does, else on the section that lacks it. */
function reportMissing({ text, misspelt, findings }: Reading, fault: Fault): void {
  const { error, node, schema } = fault;
  const key = error.params.missingProperty ?? '';
  if (misspelt.has(`${node.path} ${key}`)) return;
  const condition = conditionOf(fault);
  const blamed = condition?.blame === undefined ? undefined : node.entries?.get(condition.blame);
  const name = placeName(node.path);
  const why = condition === undefined ? `${name} needs \`${key}\`` : `${name}: ${condition.because}`;
  const message = `${why}. Add ${exampleOf(key, keySchema(schema, key))}.`;
  const fixes = fillingFix(text, node, key, schema);
  findings.add('missing-key', node.path, blamed?.written ?? node.value, message, { fixes });
}

function reportEmpty({ node, schema }: Fault, findings: Findings): void {
  const keys = schema?.kind === 'section' ? listed(Object.keys(schema.keys)) : 'a key';
  findings.add(
    'missing-key',
    node.path,
    node.value,
    `${placeName(node.path)} says nothing. Give ${keys}, or remove it.`,
  );
}

function reportExcluded(fault: Fault, findings: Findings): void {
  const { node } = fault;
  const because = conditionOf(fault)?.because ?? 'another key excludes it';
  findings.add(
    'excluded-key',
    node.path,
    node.key ?? node.value,
    `${placeName(node.path)} has no place here: ${because}.`,
  );
}

function reportCount({ node, schema }: Fault, findings: Findings): void {
  if (schema?.kind !== 'count') return;
  const text = clip(node.text ?? '');
  const message = `${placeName(node.path)} is ${text}; it must be from ${schema.least} to ${schema.most}.`;
  findings.add('out-of-range', node.path, node.written, message);
}

function reportType({ text, findings }: Reading, { node, schema, required }: Fault): void {
  if (schema === undefined) return;
  const code = node.kind === 'null' ? 'missing-value' : 'wrong-type';
  const where = node.kind === 'scalar' ? node.written : node.value;
  const fixes = node.kind === 'null' ? valueFix(text, node, schema) : [];
  findings.add(code, node.path, where, describeWrongType(node, schema, required), { fixes });
}

function reportChoice({ node, schema }: Fault, findings: Findings): void {
  if (schema?.kind !== 'choice') return;
  const allowed = schema.allowed.map(String);
  const text = node.text ?? '';
  const meant = allowed.length === 1 ? allowed[0] : nearest(text, allowed);
  const fixes = meant === undefined ? [] : [{ title: `Change to \`${meant}\``, range: node.written, text: meant }];
  const hint = meant === undefined || allowed.length === 1 ? '' : ` Did you mean \`${meant}\`?`;
  const message = `${placeName(node.path)} can be ${listed(allowed)}, not \`${clip(text)}\`.${hint}`;
  findings.add('not-allowed', node.path, node.written, message, { fixes });
}
