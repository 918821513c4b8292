import { type CancellationToken, type Uri, workspace } from 'vscode';
import type { BaseLanguageClient } from 'vscode-languageclient';
import { isCheckResult, isExplorationState, isExportResult, isReadoutState } from '../protocol/guard.ts';
import type { ExplorationState, ReadoutState } from '../protocol/readout.ts';
import {
  type CheckParams,
  type CheckResult,
  checkRequest,
  type ExportParams,
  explorationRequest,
  exportRequest,
  readoutRequest,
  templateRequest,
} from '../protocol/requests.ts';

/** What the editor asks of the language server; every answer is looked at before it is believed. */
export interface ServerQuestions {
  uriOf(uri: Uri): string;
  /** What the readout shows; undefined where the document is no design. Rejects where it can't be opened. */
  readout(uri: Uri): Promise<ReadoutState | undefined>;
  /** Undefined without a pulse, and where a newer version or the token has made it pointless. */
  exploration(uri: Uri, token: CancellationToken): Promise<ExplorationState | undefined>;
  exportText(uri: Uri, params: WithoutUri<ExportParams>): Promise<string | undefined>;
  template(): Promise<string>;
  /** What the command's `check` would print of a text. */
  check(params: CheckParams): Promise<CheckResult>;
}

type WithoutUri<Params> = Params extends { readonly uri: string } ? Omit<Params, 'uri'> : never;

export function createServerQuestions(client: BaseLanguageClient): ServerQuestions {
  const uriOf = (uri: Uri): string => client.code2ProtocolConverter.asUri(uri);
  // The answer to a version that has passed is an error by protocol; the version that is there now is asked again.
  const ask = async (method: string, params: unknown): Promise<unknown> => {
    for (let attempt = 0; ; attempt++) {
      try {
        return await client.sendRequest<unknown>(method, params);
      } catch (error) {
        if (!isPassed(error)) throw error;
        if (attempt >= 5) return undefined;
      }
    }
  };
  return {
    uriOf,
    async readout(uri) {
      // A readout restored with the window may be there before its design: opening tells the server about it.
      await workspace.openTextDocument(uri);
      const state = await ask(readoutRequest, { uri: uriOf(uri) });
      return isReadoutState(state) ? state : undefined;
    },
    async exploration(uri, token) {
      try {
        const found: unknown = await client.sendRequest<unknown>(explorationRequest, { uri: uriOf(uri) }, token);
        return isExplorationState(found) ? found : undefined;
      } catch (error) {
        if (token.isCancellationRequested || isPassed(error)) return undefined;
        throw error;
      }
    },
    async exportText(uri, params) {
      await workspace.openTextDocument(uri);
      const result = await ask(exportRequest, { uri: uriOf(uri), ...params });
      return isExportResult(result) ? result.text : undefined;
    },
    async template() {
      const text = await client.sendRequest<unknown>(templateRequest);
      return typeof text === 'string' ? text : '';
    },
    async check(params) {
      const result = await client.sendRequest<unknown>(checkRequest, params);
      if (!isCheckResult(result)) throw new Error('the language server gave no answer');
      return result;
    },
  };
}

/** LSP's codes for what has been cancelled by either side, or was about an earlier text. */
const PASSED: readonly unknown[] = [-32800, -32801, -32802];

function isPassed(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'code' in error && PASSED.includes(error.code);
}
