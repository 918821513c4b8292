import type { InlayHint } from 'vscode-languageserver-protocol';
import { lineAt } from '../core/design/lines.ts';
import type { Prediction } from '../core/physics/prediction.ts';
import type { TextRange } from '../core/report/problem.ts';
import type { Settings } from '../protocol/requests.ts';
import { show } from './show.ts';
import type { Subject } from './subject.ts';

interface Hint {
  readonly section: string;
  readonly setting: keyof Settings['inlayHints'];
  /** What to show; undefined where the prediction has no such figure. */
  label(prediction: Prediction): string | undefined;
  readonly explanation: string;
}

/** Figures that follow from a section, each where that section decides it. */
const HINTS: readonly Hint[] = [
  {
    section: 'pump',
    setting: 'pump',
    label: ({ state }) => stored(state.stored_energy_J),
    explanation:
      'Energy in the upper level just before the pulse, all of the medium: ions there times the energy of a laser photon.',
  },
  {
    section: 'resonator',
    setting: 'resonator',
    label: ({ state }) => gainAndLoss(state.round_trip_gain_log, state.round_trip_loss_log),
    explanation:
      'Natural logarithms for one round trip, switch open: small-signal gain just before the pulse, and loss −ln(R) − ln(1 − round_trip_loss).',
  },
  {
    section: 'q_switch',
    setting: 'qSwitch',
    label: ({ state }) => ratio(state.inversion_ratio),
    explanation: 'Round-trip gain over loss when the switch opens: how many times above threshold the pulse starts.',
  },
];

/** Hints at the ends of the lines that open the sections, where nothing they push aside can jump. */
export function inlayHints(
  { analysis, toRange, text }: Subject,
  shown: TextRange,
  settings: Settings['inlayHints'],
): InlayHint[] {
  const { prediction, design } = analysis;
  if (prediction === undefined) return [];
  return HINTS.flatMap(({ section, setting, label, explanation }): InlayHint[] => {
    const key = settings[setting] ? design.root?.entries?.get(section)?.key : undefined;
    const words = label(prediction);
    if (key === undefined || words === undefined) return [];
    const { end } = lineAt(text, key.start);
    if (end < shown.start || key.start > shown.end) return [];
    return [{ position: toRange({ start: end, end }).start, label: words, tooltip: explanation, paddingLeft: true }];
  });
}

function stored(energy: number | undefined): string | undefined {
  return energy === undefined ? undefined : `stored ${show(energy, 'energy')}`;
}

function gainAndLoss(gain: number | undefined, loss: number): string | undefined {
  return gain === undefined ? undefined : `gain ${show(gain, 'ratio')}, loss ${show(loss, 'ratio')}`;
}

function ratio(value: number | undefined): string | undefined {
  return value === undefined ? undefined : `inversion ratio ${show(value, 'ratio')}`;
}
