import type { Analysis } from '../analyse.ts';

/** Questions about an analysis that take more predictions, each answered once and then remembered. */
export interface Explorer {
  readonly analysis: Analysis;
}

export function createExplorer(analysis: Analysis): Explorer {
  return { analysis };
}
