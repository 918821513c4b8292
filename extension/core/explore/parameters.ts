import type { Analysis } from '../analyse.ts';
import type { ReadDesign } from '../design/read.ts';
import type { Limit } from '../design/schema.ts';
import { steps } from '../design/steps.ts';
import { parentPath, type TreeNode } from '../design/tree.ts';

/** A number of a design that its prediction depends on. */
export interface Parameter {
  readonly path: string;
  /** SI. */
  readonly value: number;
  /** SI, the half-width; absent where none is written. */
  readonly tolerance?: number;
}

const MOST_PARAMETERS = 400;

const BESIDE_THE_PULSE = /^(requirements|x-|title$|format$)/;

/** The number at a path, written or filled in; undefined for everything else. */
export function parameterAt({ design, resolved }: Analysis, path: string): Parameter | undefined {
  const schema = BESIDE_THE_PULSE.test(path) ? undefined : design.schemaOf(path);
  if (schema?.kind !== 'quantity' && schema?.kind !== 'count') return undefined;
  const written = valueAt(design.values, path);
  if (typeof written === 'number') return { path, value: written };
  if (!isQuantity(written)) {
    const origin = resolved.origins.get(path);
    return origin && { path, value: origin.value };
  }
  const { value, tolerance } = written;
  return { path, value, ...(tolerance !== undefined && { tolerance }) };
}

/** The numbers that the file writes, in its order, 400 at most; what a merge brings in counts where it is used. */
export function writtenParameters(analysis: Analysis): readonly Parameter[] {
  const found: Parameter[] = [];
  const visit = (node: TreeNode): void => {
    if (BESIDE_THE_PULSE.test(node.path) || found.length >= MOST_PARAMETERS) return;
    const parameter = node.kind === 'scalar' ? parameterAt(analysis, node.path) : undefined;
    if (parameter !== undefined) found.push(parameter);
    for (const child of node.entries?.values() ?? node.items ?? []) visit(child);
  };
  if (analysis.design.root !== undefined) visit(analysis.design.root);
  return found;
}

/** Whether the schema and its neighbours let a parameter take a value. */
export function allows(design: ReadDesign, path: string, value: number): boolean {
  const schema = design.schemaOf(path);
  if (schema?.kind === 'count') return value > 0;
  if (schema?.kind !== 'quantity' || !schema.limits.every((limit) => within(value, limit))) return false;
  const section = parentPath(path);
  const around = section === undefined ? undefined : design.schemaOf(section);
  if (around?.kind !== 'section' || around.order === undefined) return true;
  const { lower, upper, strict } = around.order;
  const other = (key: string): number | undefined => {
    const found = valueAt(design.values, `${section}.${key}`);
    return isQuantity(found) ? found.value : undefined;
  };
  const [low, high] = [
    path.endsWith(`.${lower}`) ? value : other(lower),
    path.endsWith(`.${upper}`) ? value : other(upper),
  ];
  return low === undefined || high === undefined || low < high || (low === high && !strict);
}

function within(value: number, { bound, value: limit }: Limit): boolean {
  return { above: value > limit, 'at least': value >= limit, below: value < limit, 'at most': value <= limit }[bound];
}

interface Written {
  readonly value: number;
  readonly tolerance?: number;
}

function isQuantity(value: unknown): value is Written {
  return typeof value === 'object' && value !== null && 'value' in value && typeof value.value === 'number';
}

function valueAt(values: unknown, path: string): unknown {
  return steps(path).reduce<unknown>((inner, step) => {
    if (typeof inner !== 'object' || inner === null) return undefined;
    if (Array.isArray(inner)) return typeof step === 'number' ? inner[step] : undefined;
    return Object.hasOwn(inner, step) ? Reflect.get(inner, step) : undefined;
  }, values);
}
