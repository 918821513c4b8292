import { chartIds, type LineChart } from './chart.ts';
import type { HostMessage, PageMemory, PageMessage } from './messages.ts';
import type { ExplorationState, Pinned, ReadoutState } from './readout.ts';
import {
  type AnalysedParams,
  type CheckParams,
  type CheckResult,
  defaultSettings,
  type ExportParams,
  type ExportResult,
  type ReadoutParams,
  type ServerOptions,
  type Settings,
} from './requests.ts';

/** Messages cross a process boundary as plain data of any shape: these tell whether one is what it claims to be. */
type Shape = Readonly<Record<string, (value: unknown) => boolean>>;

function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

const text = (value: unknown): boolean => typeof value === 'string';
const optionalText = (value: unknown): boolean => value === undefined || text(value);
const flag = (value: unknown): boolean => typeof value === 'boolean';
const number = (value: unknown): boolean => Number.isFinite(value);
const optionalNumber = (value: unknown): boolean => value === undefined || number(value);
const whole = (value: unknown): boolean => Number.isSafeInteger(value);
const line = (value: unknown): boolean => typeof value === 'number' && Number.isSafeInteger(value) && value >= 1;
const numbers = (value: unknown): boolean => Array.isArray(value) && value.every((item) => Number.isFinite(item));
const oneOf = (...allowed: readonly string[]): ((value: unknown) => boolean) => {
  return (value) => typeof value === 'string' && allowed.includes(value);
};
const listOf = (item: (value: unknown) => boolean): ((value: unknown) => boolean) => {
  return (value) => Array.isArray(value) && value.every(item);
};
const shaped = (shape: Shape): ((value: unknown) => boolean) => {
  return (value) => isRecord(value) && Object.entries(shape).every(([key, test]) => test(value[key]));
};

const verdict = oneOf('good', 'look', 'bad', 'unknown');
const figures = listOf(shaped({ label: text, value: optionalText, amount: optionalNumber }));

const axis = shaped({ label: text, unit: text, scale: number });
const chartId = oneOf(...chartIds);

const lineChart = (value: unknown): boolean =>
  shaped({
    id: chartId,
    title: text,
    x: shaped({ label: text, unit: text, scale: number, values: numbers, logarithmic: flag }),
    left: axis,
    right: axis,
    lines: listOf(shaped({ label: text, axis: oneOf('left', 'right'), values: numbers })),
    marks: listOf(shaped({ kind: oneOf('present', 'optimum'), label: text, x: number })),
    summary: text,
  })(value) && sameLengths(value);

/** Of an object whose parts have been looked at. */
function sameLengths(value: unknown): boolean {
  const { x, lines } = value as LineChart;
  return lines.every(({ values }) => values.length === x.values.length);
}

const barChart = shaped({
  id: chartId,
  title: text,
  axis,
  bars: listOf(shaped({ label: text, value: number, limit: optionalNumber, wanted: optionalNumber, verdict })),
  summary: text,
});

const charts = listOf(
  (value) =>
    isRecord(value) && (value['kind'] === 'lines' ? lineChart(value) : value['kind'] === 'bars' && barChart(value)),
);

const state = shaped({
  uri: text,
  version: whole,
  title: text,
  model: optionalText,
  absence: optionalText,
  headline: figures,
  groups: listOf(shaped({ name: text, figures })),
  charts,
  surfaces: listOf(shaped({ name: text, fluence: text, threshold: optionalText, margin: optionalText, verdict })),
  requirements: listOf(shaped({ name: text, required: text, predicted: optionalText, verdict })),
  validity: listOf(text),
  problems: listOf(
    shaped({
      severity: oneOf('error', 'warning', 'information'),
      accepted: optionalText,
      code: text,
      message: text,
      line,
    }),
  ),
});

const exploration = shaped({
  uri: text,
  version: whole,
  charts,
  parameters: listOf(
    shaped({
      path: text,
      value: text,
      line,
      energy: optionalText,
      peak: optionalText,
      width: optionalText,
      margin: optionalText,
    }),
  ),
});

const pinned = shaped({ state, exploration: (value) => value === undefined || exploration(value) });

export function isReadoutState(value: unknown): value is ReadoutState {
  return state(value);
}

export function isExplorationState(value: unknown): value is ExplorationState {
  return exploration(value);
}

export function isPinned(value: unknown): value is Pinned {
  return pinned(value);
}

const hostMessages: Readonly<Record<HostMessage['type'], (value: unknown) => boolean>> = {
  state: shaped({ state, pinned: (value) => value === undefined || pinned(value) }),
  exploration: shaped({ exploration }),
  cursor: shaped({ line }),
  unavailable: shaped({ reason: text }),
};

const pageMessages: Readonly<Record<PageMessage['type'], (value: unknown) => boolean>> = {
  ready: () => true,
  pin: shaped({ pin: flag }),
  copy: () => true,
  export: shaped({ chart: chartId, format: oneOf('csv', 'svg') }),
  picture: shaped({ chart: chartId, data: (value) => typeof value === 'string' && pngUrl.test(value) }),
  reveal: shaped({ line }),
};

const pngUrl = /^data:image\/png;base64,[A-Za-z0-9+/]+=*$/;

function isOneOf(value: unknown, tests: Readonly<Record<string, (value: unknown) => boolean>>): boolean {
  if (!isRecord(value)) return false;
  const { type } = value;
  return typeof type === 'string' && Object.hasOwn(tests, type) && tests[type]?.(value) === true;
}

export function isHostMessage(value: unknown): value is HostMessage {
  return isOneOf(value, hostMessages);
}

export function isPageMessage(value: unknown): value is PageMessage {
  return isOneOf(value, pageMessages);
}

export function isPageMemory(value: unknown): value is PageMemory {
  return shaped({ uri: text, tables: listOf(chartId) })(value);
}

export function isAnalysed(value: unknown): value is AnalysedParams {
  return shaped({ uri: text, version: whole, headline: text, errors: whole, warnings: whole })(value);
}

export function isReadoutParams(value: unknown): value is ReadoutParams {
  return shaped({ uri: text })(value);
}

export function isExportParams(value: unknown): value is ExportParams {
  if (!isRecord(value) || !text(value['uri'])) return false;
  const { what, format } = value;
  return what === 'figures' ? oneOf('text', 'csv')(format) : chartId(what) && oneOf('csv', 'svg')(format);
}

export function isCheckParams(value: unknown): value is CheckParams {
  return shaped({ file: text, text })(value);
}

export function isCheckResult(value: unknown): value is CheckResult {
  return shaped({ lines: listOf(text), errors: whole, warnings: whole, notes: whole, accepted: whole })(value);
}

export function isExportResult(value: unknown): value is NonNullable<ExportResult> {
  return shaped({ version: whole, text })(value);
}

/** The options that are usable among what a client sent, which may be anything or nothing. */
export function serverOptions(value: unknown): ServerOptions {
  if (!isRecord(value)) return {};
  const { checksUri, readoutCommand, settings } = value;
  return {
    ...(typeof checksUri === 'string' && { checksUri }),
    ...(typeof readoutCommand === 'string' && { readoutCommand }),
    ...(settings !== undefined && { settings: settingsOf(settings) }),
  };
}

/** Settings as a client sent them; whatever is not a plain yes or no stays at its default. */
export function settingsOf(value: unknown): Settings {
  const part = (name: string): Readonly<Record<string, unknown>> => {
    const inner = isRecord(value) ? value[name] : undefined;
    return isRecord(inner) ? inner : {};
  };
  const yes = (given: unknown, fallback: boolean): boolean => (typeof given === 'boolean' ? given : fallback);
  const { codeLens, inlayHints } = defaultSettings;
  const [lens, hints] = [part('codeLens'), part('inlayHints')];
  return {
    codeLens: { prediction: yes(lens['prediction'], codeLens.prediction) },
    inlayHints: {
      pump: yes(hints['pump'], inlayHints.pump),
      resonator: yes(hints['resonator'], inlayHints.resonator),
      qSwitch: yes(hints['qSwitch'], inlayHints.qSwitch),
    },
  };
}
