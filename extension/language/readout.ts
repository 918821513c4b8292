import type { Analysis } from '../core/analyse.ts';
import type { Problem } from '../core/report/problem.ts';
import type { ProblemRow, ReadoutState } from '../protocol/readout.ts';
import { surfacesChart } from './charts/surfaces-chart.ts';
import { waveformChart } from './charts/waveform-chart.ts';
import { titleOf } from './design-title.ts';
import { failureMessage } from './diagnostics.ts';
import { figureGroups, headlineFigures, modelName } from './figures.ts';
import type { Subject } from './subject.ts';
import { requirementRow, surfaceRow } from './verdicts.ts';

/** What the readout shows for one version of a design. */
export function readout(subject: Subject): ReadoutState {
  const { analysis } = subject;
  const { prediction, problems } = analysis;
  const charts = [waveformChart(analysis), surfacesChart(analysis)].filter((chart) => chart !== undefined);
  return {
    ...shell(subject, titleOf(analysis.design) ?? fileName(subject.uri)),
    headline: headlineFigures(prediction),
    problems: problems.filter(isNoValidityNote(analysis)).map((problem) => problemRow(problem, subject)),
    ...(prediction === undefined
      ? {}
      : {
          model: modelName(prediction),
          groups: figureGroups(prediction, analysis.outcome?.holdOffMargin),
          surfaces: prediction.surfaces.map((surface, index) => surfaceRow(surface, index, problems)),
          requirements: prediction.requirements.map(requirementRow),
          validity: prediction.validity.map(({ message }) => message),
        }),
    ...(prediction?.pulse === undefined ? { absence: absence(problems) } : {}),
    charts,
  };
}

/** The same page after a fault of ours: no figure, and the reason why. */
export function failedReadout({ uri, version, failure }: Failure): ReadoutState {
  const message = failureMessage(failure);
  return {
    ...shell({ uri, version }, fileName(uri)),
    absence: message,
    problems: [{ severity: 'error', code: 'internal-failure', message, line: 1 }],
  };
}

interface Failure extends Pick<Subject, 'uri' | 'version'> {
  readonly failure: string;
}

function shell({ uri, version }: Pick<Subject, 'uri' | 'version'>, title: string): ReadoutState {
  const nothing = { charts: [], groups: [], surfaces: [], requirements: [], validity: [], problems: [] };
  return { uri, version, title, headline: headlineFigures(undefined), ...nothing };
}

function fileName(uri: string): string {
  const name = uri.slice(uri.lastIndexOf('/') + 1);
  try {
    return decodeURIComponent(name);
  } catch {
    return name;
  }
}

/** Validity notes have a place of their own on the page. */
function isNoValidityNote({ prediction }: Analysis): (problem: Problem) => boolean {
  const notes = new Set(prediction?.validity.map(({ code, message }) => `${code} ${message}`));
  return ({ code, message }) => !notes.has(`${code} ${message}`);
}

function problemRow({ severity, code, message, range, accepted }: Problem, { toRange }: Subject): ProblemRow {
  const line = toRange(range).start.line + 1;
  return { severity, code, message, line, ...(accepted && { accepted: accepted.reason }) };
}

/** Why there is no pulse: the first errors are what must be mended. */
function absence(problems: readonly Problem[]): string {
  const errors = problems.filter(({ severity }) => severity === 'error');
  const [first] = errors;
  if (first === undefined) return 'The model predicts no pulse for this design.';
  const more = errors.length - 1;
  const others = more === 0 ? '' : ` (and ${more} more error${more === 1 ? '' : 's'}, below)`;
  return `No pulse is predicted: ${first.message}${others}`;
}
