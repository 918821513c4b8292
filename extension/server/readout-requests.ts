import type { Connection } from 'vscode-languageserver';
import type { Analysis } from '../core/analyse.ts';
import { countsOf, findingLines } from '../core/report/findings-text.ts';
import { exploration } from '../language/exploration/exploration.ts';
import { exported } from '../language/export/exported.ts';
import { failedReadout, readout } from '../language/readout.ts';
import { template } from '../language/template.ts';
import { isCheckParams, isExportParams, isReadoutParams } from '../protocol/guard.ts';
import {
  type CheckResult,
  checkRequest,
  type ExplorationResult,
  type ExportResult,
  explorationRequest,
  exportRequest,
  type ReadoutResult,
  readoutRequest,
  type TemplateResult,
  templateRequest,
} from '../protocol/requests.ts';
import { type Answers, pause } from './answers.ts';

/** Answers our own requests: what the readout shows, its curves, exports, the check of a text, and that of a new design. */
export function answerReadout(connection: Connection, { own }: Answers, analyse: (text: string) => Analysis): void {
  const open = (params: unknown): string | undefined => (isReadoutParams(params) ? params.uri : undefined);

  connection.onRequest(
    readoutRequest,
    own<ReadoutResult>(open, (analysed) => ('failure' in analysed ? failedReadout(analysed) : readout(analysed))),
  );
  connection.onRequest(
    explorationRequest,
    own<ExplorationResult>(open, async (analysed, _params, stillWanted) => {
      if ('failure' in analysed) return null;
      return (await exploration(analysed, afterPause(stillWanted))) ?? null;
    }),
  );
  connection.onRequest(
    exportRequest,
    own<ExportResult>(open, async (analysed, params, stillWanted) => {
      if ('failure' in analysed || !isExportParams(params)) return null;
      const text = await exported(analysed, params, afterPause(stillWanted));
      return text === undefined ? null : { version: analysed.version, text };
    }),
  );
  connection.onRequest(checkRequest, (params: unknown): CheckResult | null => {
    if (!isCheckParams(params)) return null;
    const { problems } = analyse(params.text);
    return { lines: findingLines(params.file, params.text, problems), ...countsOf(problems) };
  });
  connection.onRequest(templateRequest, (): TemplateResult => template());
}

function afterPause(stillWanted: () => boolean): () => Promise<boolean> {
  return async () => {
    await pause();
    return stillWanted();
  };
}
