import type { HostMessage, PageMemory, PageMessage } from './messages.ts';
import type { ReadoutState } from './readout.ts';
import type { AnalysedParams, ReadoutParams, ServerOptions } from './requests.ts';

/** Messages cross a process boundary as plain data of any shape: these tell whether one is what it claims to be. */
type Shape = Readonly<Record<string, (value: unknown) => boolean>>;

function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

const text = (value: unknown): boolean => typeof value === 'string';
const optionalText = (value: unknown): boolean => value === undefined || text(value);
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
const figures = listOf(shaped({ label: text, value: optionalText }));

const waveform = (value: unknown): boolean => {
  if (value === undefined) return true;
  if (!isRecord(value)) return false;
  const { time, power, inversion } = value;
  return (
    shaped({ timeUnit: text, powerUnit: text, summary: text, time: numbers, power: numbers, inversion: numbers })(
      value,
    ) &&
    Array.isArray(time) &&
    Array.isArray(power) &&
    Array.isArray(inversion) &&
    time.length === power.length &&
    time.length === inversion.length
  );
};

const state = shaped({
  uri: text,
  version: whole,
  title: text,
  model: optionalText,
  absence: optionalText,
  headline: figures,
  groups: listOf(shaped({ name: text, figures })),
  waveform,
  surfaces: listOf(shaped({ name: text, fluence: text, threshold: optionalText, margin: optionalText, verdict })),
  requirements: listOf(shaped({ name: text, required: text, predicted: optionalText, verdict })),
  validity: listOf(text),
  problems: listOf(shaped({ severity: oneOf('error', 'warning', 'information'), code: text, message: text, line })),
});

export function isReadoutState(value: unknown): value is ReadoutState {
  return state(value);
}

export function isHostMessage(value: unknown): value is HostMessage {
  if (!isRecord(value)) return false;
  const { type, state: shown, reason } = value;
  return (type === 'state' && state(shown)) || (type === 'unavailable' && text(reason));
}

export function isPageMessage(value: unknown): value is PageMessage {
  if (!isRecord(value)) return false;
  const { type, text: copied, line: revealed } = value;
  return type === 'ready' || (type === 'copy' && text(copied)) || (type === 'reveal' && line(revealed));
}

export function isPageMemory(value: unknown): value is PageMemory {
  return shaped({ uri: text, tableShown: (shown) => typeof shown === 'boolean' })(value);
}

export function isAnalysed(value: unknown): value is AnalysedParams {
  return shaped({ uri: text, version: whole })(value);
}

export function isReadoutParams(value: unknown): value is ReadoutParams {
  return shaped({ uri: text })(value);
}

/** The options that are usable among what a client sent, which may be anything or nothing. */
export function serverOptions(value: unknown): ServerOptions {
  if (!isRecord(value)) return {};
  const { checksUri } = value;
  return typeof checksUri === 'string' ? { checksUri } : {};
}
