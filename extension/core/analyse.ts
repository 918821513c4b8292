import { accept } from './checks/acceptance.ts';
import type { CheckContext } from './checks/check.ts';
import { CHECKS } from './checks/registry.ts';
import { type ReadDesign, readDesign } from './design/read.ts';
import { type ResolvedDesign, resolveDesign } from './design/resolve.ts';
import { wantedFigures } from './design/wanted.ts';
import { type Outcome, predict } from './physics/predict.ts';
import type { Prediction, Waveform } from './physics/prediction.ts';
import type { Problem } from './report/problem.ts';

/** All that is known of a design's text. */
export interface Analysis {
  readonly design: ReadDesign;
  /** Figures that the file does not give itself, and the module where it is complete. */
  readonly resolved: ResolvedDesign;
  /** Absent while the design is incomplete or invalid. */
  readonly prediction?: Prediction;
  /** In the order of the text. */
  readonly problems: readonly Problem[];
  readonly outcome?: Outcome;
}

/** The one door: a design's text in, prediction and problems out. Never throws, whatever the text. */
export function analyse(text: string): Analysis {
  const design = readDesign(text);
  const resolved = resolveDesign(design);
  const problems = [...design.problems, ...resolved.problems];
  const { module, origins } = resolved;
  const settled = (all: readonly Problem[], judged: boolean) => inOrder(accept(text, design, all, judged));
  if (!module) return { design, resolved, problems: settled(problems, false) };
  const outcome = predict(module, wantedFigures(design));
  if (!outcome) {
    const path = 'q_switch.kind';
    const message =
      'This release predicts actively switched modules only: a saturable absorber or gain switching gets no prediction yet.';
    const unmodelled: Problem = {
      code: 'switch-not-modelled',
      severity: 'error',
      message,
      path,
      range: design.rangeOf(path),
    };
    return { design, resolved, problems: settled([...problems, unmodelled], false) };
  }
  const found = runChecks({ design, origins, module, outcome });
  const validity = found.flatMap(({ severity, code, message }) =>
    severity === 'information' ? [{ code, message }] : [],
  );
  return {
    design,
    resolved,
    prediction: { ...outcome.figures, validity },
    problems: settled([...problems, ...found], true),
    outcome,
  };
}

/** The settled pulse's course in time at about `points` places; undefined where there is no pulse. */
export function waveform(analysis: Analysis, points: number): Waveform | undefined {
  return analysis.outcome?.train.settled?.waveform(points);
}

function runChecks(context: CheckContext): Problem[] {
  return CHECKS.flatMap(({ code, run }) =>
    run(context).map((finding) => ({ code, ...finding, range: context.design.rangeOf(finding.path) })),
  );
}

function inOrder(problems: readonly Problem[]): Problem[] {
  return [...problems].sort((a, b) => a.range.start - b.range.start);
}
