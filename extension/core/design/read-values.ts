import { type Quantity, readQuantity } from '../quantity/quantity.ts';
import type { TextRange } from '../report/problem.ts';
import type { Findings } from './finding.ts';
import type { Limit, QuantitySchema, SchemaNode, SectionSchema } from './schema.ts';
import { keySchema } from './schema.ts';
import type { TreeNode } from './tree.ts';
import { clip, placeName } from './wording.ts';

/** The value that the schema's type for this place describes; undefined where the text gives none that can be used. */
export function readValue(node: TreeNode, schema: SchemaNode, findings: Findings): unknown {
  switch (schema.kind) {
    case 'section':
      return node.entries && readSection(node, node.entries, schema, findings);
    case 'list':
      return node.items?.map((item) => readValue(item, schema.item, findings) ?? {});
    case 'quantity':
      return node.kind === 'scalar' ? readOne(node, schema, findings) : undefined;
    case 'choice':
      return schema.allowed.find((allowed) => allowed === node.data);
    case 'text':
      return node.kind === 'scalar' ? node.text : undefined;
    case 'count': {
      const { data } = node;
      const whole = typeof data === 'number' && Number.isInteger(data);
      return whole && data >= schema.least && data <= schema.most ? data : undefined;
    }
  }
}

function readSection(
  node: TreeNode,
  entries: ReadonlyMap<string, TreeNode>,
  schema: SectionSchema,
  findings: Findings,
): Record<string, unknown> {
  const values: Record<string, unknown> = {};
  for (const [key, child] of entries) {
    const inner = keySchema(schema, key);
    const value = inner && readValue(child, inner, findings);
    if (value !== undefined) values[key] = value;
  }
  if (schema.order !== undefined) checkOrder(node, values, schema.order, findings);
  return values;
}

function readOne(node: TreeNode, schema: QuantitySchema, findings: Findings): Quantity | undefined {
  const text = node.text ?? '';
  const read = readQuantity(text, schema.dimension);
  if ('problem' in read) {
    const { code, message, range, fixes } = read.problem;
    const mended = node.textStart === undefined ? [] : fixes.map((fix) => ({ ...fix, range: inFile(node, fix.range) }));
    findings.add(
      code,
      node.path,
      inFile(node, range),
      `${placeName(node.path)}: ${message}${message.endsWith('?') ? '' : '.'}`,
      { fixes: mended },
    );
    return undefined;
  }
  const { quantity } = read;
  const broken = schema.limits.find((limit) => !within(quantity.value, limit));
  if (broken !== undefined) {
    const because = broken.why === undefined ? '' : `: ${broken.why}`;
    const message = `${placeName(node.path)} is ${clip(text)}; it must be ${broken.bound} ${broken.text}${because}.`;
    findings.add('out-of-range', node.path, node.written, message);
    return undefined;
  }
  const widest = schema.limits.findLast((limit) => limit.bound === 'below' || limit.bound === 'at most');
  if (quantity.tolerance !== undefined && widest !== undefined && quantity.tolerance > widest.value) {
    const message = `The tolerance of ${placeName(node.path)} is beyond ${widest.text}, the most its value can be.`;
    findings.add('out-of-range', node.path, node.written, message);
    return undefined;
  }
  const { usual } = schema;
  if (usual !== undefined && (quantity.value < usual.low.value || quantity.value > usual.high.value)) {
    const why = usual.why === undefined ? '' : `: ${usual.why}`;
    const range = `${usual.low.text} to ${usual.high.text}`;
    const message = `${placeName(node.path)} is ${clip(text)}; usual is ${range}${why}. Is it meant?`;
    findings.add('unusual-value', node.path, node.written, message, { severity: 'warning' });
  }
  return quantity;
}

function within(value: number, limit: Limit): boolean {
  switch (limit.bound) {
    case 'above':
      return value > limit.value;
    case 'at least':
      return value >= limit.value;
    case 'below':
      return value < limit.value;
    case 'at most':
      return value <= limit.value;
  }
}

function checkOrder(
  node: TreeNode,
  values: Record<string, unknown>,
  order: NonNullable<SectionSchema['order']>,
  findings: Findings,
): void {
  const lower = siOf(values[order.lower]);
  const upper = siOf(values[order.upper]);
  if (lower === undefined || upper === undefined || lower < upper || (lower === upper && !order.strict)) return;
  const child = node.entries?.get(order.upper);
  if (child === undefined) return;
  const relation = order.strict ? 'must be above' : 'must not be below';
  const message = `${placeName(child.path)} ${relation} \`${order.lower}\`: ${order.because}.`;
  findings.add('out-of-range', child.path, child.written, message);
}

function siOf(value: unknown): number | undefined {
  if (typeof value !== 'object' || value === null || !('value' in value)) return undefined;
  return typeof value.value === 'number' ? value.value : undefined;
}

/** A range within a scalar's text, in the file; the whole value where escapes or folded lines shift characters. */
function inFile(node: TreeNode, range: TextRange): TextRange {
  if (node.textStart === undefined || range.end <= range.start) return node.written;
  return { start: node.textStart + range.start, end: node.textStart + range.end };
}
