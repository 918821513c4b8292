import { PassThrough } from 'node:stream';
import { expect, test } from 'vitest';
import { createConnection } from 'vscode-languageserver/node';
import {
  createProtocolConnection,
  DidOpenTextDocumentNotification,
  HoverRequest,
  InitializeRequest,
  PublishDiagnosticsNotification,
  type PublishDiagnosticsParams,
  StreamMessageReader,
  StreamMessageWriter,
} from 'vscode-languageserver-protocol/node';
import { readoutRequest } from '../../extension/protocol/requests.ts';
import { serve } from '../../extension/server/serve.ts';

test('a fault in the analysis becomes a visible problem, and the server goes on', async () => {
  const toServer = new PassThrough();
  const toClient = new PassThrough();
  serve(createConnection(new StreamMessageReader(toServer), new StreamMessageWriter(toClient)), () => {
    throw new Error('divided by a mirror');
  });
  const client = createProtocolConnection(new StreamMessageReader(toClient), new StreamMessageWriter(toServer));
  const published = new Promise<PublishDiagnosticsParams>((resolve) => {
    client.onNotification(PublishDiagnosticsNotification.type, resolve);
  });
  client.listen();
  await client.sendRequest(InitializeRequest.type, { processId: null, rootUri: null, capabilities: {} });
  const uri = 'file:///bench/a.gainmodule.yaml';
  const textDocument = { uri, languageId: 'gainmodule', version: 4, text: 'format: 1' };
  await client.sendNotification(DidOpenTextDocumentNotification.type, { textDocument });

  expect(await published).toMatchObject({
    uri,
    version: 4,
    diagnostics: [{ severity: 1, code: 'internal-failure', message: expect.stringContaining('divided by a mirror') }],
  });
  expect(await client.sendRequest(readoutRequest, { uri })).toMatchObject({
    version: 4,
    absence: expect.stringContaining('divided by a mirror'),
    problems: [{ code: 'internal-failure', line: 1 }],
  });
  const position = { line: 0, character: 2 };
  expect(await client.sendRequest(HoverRequest.type, { textDocument: { uri }, position })).toBeNull();
  client.dispose();
});
