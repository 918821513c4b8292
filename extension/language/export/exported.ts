import type { Chart } from '../../protocol/chart.ts';
import type { ExportParams } from '../../protocol/requests.ts';
import { exploration } from '../exploration/exploration.ts';
import { readout } from '../readout.ts';
import type { Subject } from '../subject.ts';
import { chartCsv } from './csv.ts';
import { figuresCsv, figuresText } from './figures-text.ts';
import { chartSvg } from './svg.ts';

/** A chart or the figures of a design as a file's text; undefined where there is no such chart, or it is no longer wanted. */
export async function exported(
  subject: Subject,
  params: ExportParams,
  stillWanted: () => Promise<boolean>,
): Promise<string | undefined> {
  const state = readout(subject);
  if (params.what === 'figures') return params.format === 'csv' ? figuresCsv(state) : figuresText(state);
  const { what, format } = params;
  const isWanted = ({ id }: Chart): boolean => id === what;
  const chart = state.charts.find(isWanted) ?? (await exploration(subject, stillWanted))?.charts.find(isWanted);
  if (chart === undefined) return undefined;
  return format === 'csv' ? chartCsv(chart) : chartSvg(chart, state.title);
}
