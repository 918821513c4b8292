import type { Analysis } from '../analyse.ts';
import { type Parameter, writtenParameters } from './parameters.ts';
import { type Sensitivity, sensitivityOf } from './sensitivity.ts';
import { type Spreads, spreadsOf } from './spread.ts';

/** Questions about an analysis that take more predictions, each answered when first asked and then remembered. */
export interface Explorer {
  /** What +1 % of the value at a path does; two predictions. */
  sensitivity(path: string): Sensitivity | undefined;
  /** What all written tolerances do together; two predictions for each of them. */
  spreads(): Spreads;
  /** Every number that the file writes and a pulse can depend on, in the file's order. */
  parameters(): readonly Parameter[];
}

export function createExplorer(analysis: Analysis): Explorer {
  const known = new Map<string, Sensitivity | undefined>();
  let parameters: readonly Parameter[] | undefined;
  let spreads: Spreads | undefined;
  const explorer: Explorer = {
    sensitivity(path) {
      if (!known.has(path)) known.set(path, sensitivityOf(analysis, path));
      return known.get(path);
    },
    spreads() {
      spreads ??= spreadsOf(explorer.parameters(), explorer.sensitivity);
      return spreads;
    },
    parameters() {
      parameters ??= writtenParameters(analysis);
      return parameters;
    },
  };
  return explorer;
}
