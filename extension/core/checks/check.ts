import type { ReadDesign } from '../design/read.ts';
import type { ResolvedDesign } from '../design/resolve.ts';
import type { GainModule } from '../physics/gain-module.ts';
import type { Outcome } from '../physics/predict.ts';
import type { Severity } from '../report/problem.ts';

/** Everything a check may look at. */
export interface CheckContext {
  readonly design: ReadDesign;
  readonly origins: ResolvedDesign['origins'];
  readonly module: GainModule;
  readonly outcome: Outcome;
}

/** What a check has found; the registry adds the code and the place in the text. */
export interface Finding {
  readonly severity: Severity;
  readonly message: string;
  /** Path of the key it is about. */
  readonly path: string;
}

/** One thing that an engineer wants to know about a design: one file, one line in the registry, one section of the docs. */
export interface Check {
  /** Also the anchor of its section in `extension/docs/checks.md`. */
  readonly code: string;
  readonly title: string;
  /** What it finds cannot be built, so that no reason can accept it. */
  readonly impossible?: true;
  run(context: CheckContext): readonly Finding[];
}
