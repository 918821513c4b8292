import type { Analysis } from '../analyse.ts';
import type { Origin } from '../design/origins.ts';
import type { Surface } from '../physics/gain-module.ts';
import type { Prediction } from '../physics/prediction.ts';
import { formatPercent, formatQuantity } from '../quantity/format.ts';
import { CAUTION } from './caution.ts';
import { toldMessage } from './findings-text.ts';
import { createPositions } from './position.ts';
import { formatLimits, formatRequirement, requirementName } from './requirement-text.ts';
import { oneLine, row, table, wrapped } from './text-layout.ts';

/** `giantpulse predict` for people: 80 columns, engineering units, the verdicts last where the eye ends. */
export function predictionText(file: string, text: string, analysis: Analysis): string {
  const { design, prediction, resolved } = analysis;
  const { title } = design.values;
  const head = [...(title === undefined ? [] : wrapped(oneLine(title), 0)), file];
  const blocks = [
    head,
    ...(prediction
      ? figureBlocks(prediction, analysis)
      : [['No prediction: the findings say what stands in the way.']]),
    filledIn(resolved.origins),
    findings(text, analysis),
    CAUTION.split('\n'),
  ];
  return `${blocks
    .filter((block) => block.length > 0)
    .map((block) => block.join('\n'))
    .join('\n\n')}\n`;
}

function figureBlocks(prediction: Prediction, { outcome }: Analysis): string[][] {
  const { pulse, state, train, coupling, surfaces, requirements, model } = prediction;
  const margin = outcome?.holdOffMargin;
  const pulseRows = pulse
    ? [
        row('energy', formatQuantity(pulse.energy_J, 'energy')),
        row('peak power', formatQuantity(pulse.peak_power_W, 'power')),
        row(
          'width, full at half maximum',
          formatQuantity(pulse.width_fwhm_s, 'time'),
          `${formatQuantity(pulse.width_equivalent_s, 'time')} energy over peak power`,
        ),
        row('build-up time', pulse.build_up_time_s, 'time', 'opening to peak'),
      ]
    : [['  none']];
  return [
    [`Pulse (${model === 'depletion' ? 'depletion form' : 'time integration'})`, ...pulseRows.flat()],
    [
      'Store and hold-off',
      ...row('stored energy', state.stored_energy_J, 'energy', extraction(state.extraction_efficiency)),
      ...row('inversion ratio', state.inversion_ratio, 'ratio', gainAndLoss(state)),
      ...row('hold-off margin', margin, 'ratio', 'loss, switch closed, over gain'),
    ],
    [
      'Train and coupling',
      ...row('repetition rate', train.repetition_rate_Hz, 'frequency'),
      ...row('average power', train.average_power_W, 'power'),
      ...row('first pulse', differs(train.first_pulse_energy_J, pulse?.energy_J), 'energy', 'from a cold start'),
      ...row('pulse after a pause', train.pulse_after_pause_energy_J, 'energy', 'the store filled up'),
      ...row('optimum reflectivity', percent(coupling.optimum_reflectivity), energyThere(coupling.optimum_energy_J)),
    ],
    surfaceTable(surfaces, outcome?.cavity.module.surfaces ?? []),
    requirementTable(requirements),
  ];
}

function surfaceTable(surfaces: Prediction['surfaces'], wanted: readonly Surface[]): string[] {
  if (surfaces.length === 0) return [];
  const rows = surfaces.map(({ name, peak_fluence_J_per_cm2, threshold_J_per_cm2, margin }, index) => [
    oneLine(name),
    formatQuantity(peak_fluence_J_per_cm2 * 1e4, 'fluence'),
    threshold_J_per_cm2 === undefined ? 'not scaled' : formatQuantity(threshold_J_per_cm2 * 1e4, 'fluence'),
    margin === undefined ? '' : margin.toPrecision(3),
    String(wanted[index]?.safetyFactor ?? ''),
  ]);
  return table(['Surface', 'peak fluence', 'threshold', 'margin', 'wanted'], rows);
}

function requirementTable(requirements: Prediction['requirements']): string[] {
  if (requirements.length === 0) return [];
  const rows = requirements.map(({ name, met, predicted, minimum, maximum }) => [
    requirementName(name),
    predicted === undefined ? 'not predicted' : formatRequirement(name, predicted),
    formatLimits(name, minimum, maximum),
    met === undefined ? '' : met ? 'met' : 'MISSED',
  ]);
  return table(['Requirement', 'predicted', 'wanted', ''], rows);
}

function filledIn(origins: ReadonlyMap<string, Origin>): string[] {
  if (origins.size === 0) return [];
  const rows = [...origins].map(([path, { kind, note, figure }]) =>
    wrapped(
      `  ${path}: ${kind === 'default' ? note : `${figure?.text ?? ''}, ${note}; ${figure?.source ?? ''}${figure?.fromMemory ? ' (from memory)' : ''}`}`,
      4,
    ),
  );
  return ['Not in the file, filled in', ...rows.flat()];
}

function findings(text: string, { problems }: Analysis): string[] {
  if (problems.length === 0) return ['No findings.'];
  const positionAt = createPositions(text);
  return [
    'Findings',
    ...problems.flatMap((problem) => {
      const { line, column } = positionAt(problem.range.start);
      return wrapped(`  ${line}:${column} ${problem.severity}: ${oneLine(toldMessage(problem))} [${problem.code}]`, 4);
    }),
  ];
}

function extraction(efficiency: number | undefined): string {
  return efficiency === undefined ? '' : `${formatPercent(efficiency)} of it extracted`;
}

function gainAndLoss({ round_trip_gain_log: gain, round_trip_loss_log: loss }: Prediction['state']): string {
  return gain === undefined ? '' : `log gain ${gain.toPrecision(3)} over loss ${loss.toPrecision(3)}`;
}

function percent(fraction: number | undefined): string | undefined {
  return fraction === undefined ? undefined : formatPercent(fraction);
}

function energyThere(energy: number | undefined): string {
  return energy === undefined ? '' : `would give ${formatQuantity(energy, 'energy')}`;
}

function differs(value: number | undefined, from: number | undefined): number | undefined {
  return value !== undefined && from !== undefined && Math.abs(value / from - 1) < 1e-3 ? undefined : value;
}
