import type { Analysis } from '../analyse.ts';
import { type Parameter, writtenParameters } from './parameters.ts';
import { type Around, around, type Sensitivity, sensitivityOf } from './sensitivity.ts';
import { type Spreads, spreadsOf } from './spread.ts';

/** Questions about an analysis that take more predictions, each answered when first asked and then remembered. */
export interface Explorer {
  /** What lies beside the value at a path; two predictions. */
  around(path: string): Around | undefined;
  /** What +1 % of the value at a path does. */
  sensitivity(path: string): Sensitivity | undefined;
  /** What all written tolerances do together; two predictions for each of them. */
  spreads(): Spreads;
  /** Every number that the file writes and a pulse can depend on, in the file's order. */
  parameters(): readonly Parameter[];
}

export function createExplorer(analysis: Analysis): Explorer {
  const known = new Map<string, Around | undefined>();
  let parameters: readonly Parameter[] | undefined;
  let spreads: Spreads | undefined;
  const explorer: Explorer = {
    around(path) {
      if (!known.has(path)) known.set(path, around(analysis, path));
      return known.get(path);
    },
    sensitivity(path) {
      const near = explorer.around(path);
      return near && sensitivityOf(near);
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
