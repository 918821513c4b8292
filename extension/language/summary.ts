import type { Analysis } from '../core/analyse.ts';
import { figureGroups, headlineFigures } from './figures.ts';
import { escaped } from './markdown.ts';
import { show } from './show.ts';
import { requirementRow } from './verdicts.ts';

/** The predicted pulse in a line or two: what an edit of the key under the cursor is about. */
export function summary(analysis: Analysis): readonly string[] {
  const { prediction, problems } = analysis;
  if (prediction?.pulse === undefined) {
    const errors = problems.filter(({ severity }) => severity === 'error').length;
    const reason = errors === 0 ? '' : `: ${errors} error${errors === 1 ? '' : 's'} to mend first`;
    return [`**No pulse is predicted**${reason}.`];
  }
  const { pulse, train } = prediction;
  const figures = [
    `**${show(pulse.energy_J, 'energy')}**`,
    `${show(pulse.peak_power_W, 'power')} peak`,
    `${show(pulse.width_fwhm_s, 'time')} FWHM`,
    ...(pulse.build_up_time_s === undefined ? [] : [`${show(pulse.build_up_time_s, 'time')} build-up`]),
    ...(train.average_power_W === undefined ? [] : [`${show(train.average_power_W, 'power')} average`]),
  ];
  return [`Predicted pulse: ${figures.join(' · ')}`, ...verdicts(analysis)];
}

/** The whole prediction, for the head of the file. */
export function fullSummary(analysis: Analysis): readonly string[] {
  const { prediction, outcome } = analysis;
  if (prediction?.pulse === undefined) return summary(analysis);
  const rows = [
    ...headlineFigures(prediction),
    ...figureGroups(prediction, outcome?.holdOffMargin).flatMap(({ figures }) => figures),
  ];
  const table = [
    '| Predicted | |',
    '|:--|--:|',
    ...rows.flatMap(({ label, value }) => (value === undefined ? [] : [`| ${label} | ${value} |`])),
  ].join('\n');
  return [table, ...verdicts(analysis), ...prediction.validity.map(({ message }) => `_${escaped(message)}_`)];
}

/** Requirements met or missed, and the margins. */
function verdicts({ prediction, outcome }: Analysis): readonly string[] {
  if (prediction === undefined) return [];
  const judged = prediction.requirements.filter(({ met }) => met !== undefined);
  const missed = judged.filter(({ met }) => met === false).map(requirementRow);
  const requirements =
    missed.length > 0
      ? [`Requirements missed: ${missed.map(({ name, required }) => `${name} ${required}`).join(', ')}.`]
      : judged.length > 0
        ? [`Requirements met: ${judged.length} of ${prediction.requirements.length}.`]
        : [];
  const margins = prediction.surfaces.flatMap(({ name, margin }) => (margin === undefined ? [] : [{ name, margin }]));
  const [tightest] = margins.sort((a, b) => a.margin - b.margin);
  const damage = tightest && `damage ${show(tightest.margin, 'ratio')} on ${escaped(tightest.name)}`;
  const holdOff = outcome?.holdOffMargin === undefined ? undefined : `hold-off ${show(outcome.holdOffMargin, 'ratio')}`;
  const known = [damage, holdOff].filter((margin) => margin !== undefined);
  return known.length === 0 ? requirements : [...requirements, `Margins: ${known.join(', ')}.`];
}
