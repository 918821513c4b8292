import { indexByPath, type TreeNode } from '../../core/design/tree.ts';
import { vary } from '../../core/explore/vary.ts';
import type { Chart } from '../../protocol/chart.ts';
import type { ExplorationState, ParameterRow } from '../../protocol/readout.ts';
import { signedPercent } from '../effects.ts';
import type { Subject } from '../subject.ts';
import { curveChart, type Point } from './curve-chart.ts';
import { type Curve, curvesOf } from './curves.ts';

/** Predictions between two looks at whether they are still wanted: some milliseconds. */
const AT_ONCE = 4;

/**
 * Curves and sensitivities of a design, some 120 predictions and two for each of its values. Between a few of them
 * `stillWanted` is asked, which also lets the server read its messages: on no, and without a pulse, there is no result.
 */
export async function exploration(
  subject: Subject,
  stillWanted: () => Promise<boolean>,
): Promise<ExplorationState | undefined> {
  const { analysis, uri, version } = subject;
  if (analysis.prediction?.pulse === undefined) return undefined;
  let done = 0;
  const goesOn = async (): Promise<boolean> => ++done % AT_ONCE !== 0 || stillWanted();
  const charts: Chart[] = [];
  for (const curve of curvesOf(analysis)) {
    const points = await pointsOf(subject, curve, goesOn);
    if (points === undefined) return undefined;
    const chart = curveChart(curve, points, analysis.prediction.coupling.optimum_reflectivity);
    if (chart !== undefined) charts.push(chart);
  }
  const parameters: ParameterRow[] = [];
  const nodes = indexByPath(analysis.design.root);
  for (const { path } of subject.explorer.parameters()) {
    if (!(await goesOn())) return undefined;
    const row = parameterRow(subject, path, nodes);
    if (row !== undefined) parameters.push(row);
  }
  return { uri, version, charts, parameters };
}

async function pointsOf(
  { analysis }: Subject,
  { path, values }: Curve,
  goesOn: () => Promise<boolean>,
): Promise<readonly Point[] | undefined> {
  const points: Point[] = [];
  for (const value of values) {
    if (!(await goesOn())) return undefined;
    const outcome = vary(analysis, [{ path, value }]);
    if (outcome?.figures.pulse !== undefined) points.push({ value, outcome });
  }
  return points;
}

/** What +1 % of a value does; undefined where it does nothing. */
function parameterRow(
  { analysis, explorer, toRange }: Subject,
  path: string,
  nodes: ReadonlyMap<string, TreeNode>,
): ParameterRow | undefined {
  const found = explorer.sensitivity(path);
  if (found === undefined || Object.values(found.effects).every((effect) => Math.abs(effect) < 1e-4)) return undefined;
  const range = analysis.design.rangeOf(path);
  const text = (effect: number | undefined) => (effect === undefined ? undefined : signedPercent(effect * 0.01));
  const { energy, peak, width, margin } = found.effects;
  const row = { energy: text(energy), peak: text(peak), width: text(width), margin: text(margin) };
  return {
    path,
    value: (nodes.get(path)?.text ?? '').trim(),
    line: toRange(range).start.line + 1,
    ...(row.energy !== undefined && { energy: row.energy }),
    ...(row.peak !== undefined && { peak: row.peak }),
    ...(row.width !== undefined && { width: row.width }),
    ...(row.margin !== undefined && { margin: row.margin }),
  };
}
