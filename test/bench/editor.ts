import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { LineCounter, parseDocument } from 'yaml';
import { analyse } from '../../extension/core/analyse.ts';
import { createExplorer } from '../../extension/core/explore/explorer.ts';
import { diagnostics } from '../../extension/language/diagnostics.ts';
import { hover } from '../../extension/language/hover.ts';
import { createAnalyses } from '../../extension/server/analyses.ts';
import { longDesign } from './long-design.ts';
import { inTurn, seconds } from './stopwatch.ts';
import { type Row, time } from './table.ts';

/** What the server does between a change and its problems, and a hover, against yaml's own parse of the same text. */
export function editing(): Row[] {
  const text = longDesign();
  const uri = 'file:///bench.gainmodule.yaml';
  let version = 1;
  let document = TextDocument.create(uri, 'gainmodule', version, text);
  const analyses = createAnalyses({ get: () => document }, analyse);
  const place = document.positionAt(text.indexOf('600 W') + 2);
  const change = () => {
    version += 1;
    const end = { line: place.line, character: place.character + 1 };
    const typed = { range: { start: place, end }, text: String(version % 10) };
    document = TextDocument.update(document, [typed], version);
    const subject = analyses.of(uri);
    if (subject === undefined || 'failure' in subject) throw new Error('no subject');
    return diagnostics(subject);
  };
  change();
  const settled = analyses.of(uri);
  if (settled === undefined || 'failure' in settled) throw new Error('no subject');
  for (const { path } of settled.explorer.parameters()) settled.explorer.around(path);
  const at = settled.text.indexOf('output_reflectivity');
  const parse = () => parseDocument(text, { keepSourceTokens: true, lineCounter: new LineCounter() });
  const cold = () => hover({ ...settled, explorer: createExplorer(settled.analysis) }, at);
  const [warm = Number.NaN, first = Number.NaN, plain = Number.NaN, placed = Number.NaN] = inTurn(
    [() => hover(settled, at), cold, () => parseDocument(text), parse],
    4,
  );
  const [changed = Number.NaN, beside = Number.NaN] = inTurn([change, () => parseDocument(text)], 3);
  return [
    {
      what: 'change to problems, in the server',
      ours: time(changed),
      other: time(beside),
      ratio: changed / beside,
      target: { most: 2 },
    },
    { what: 'hover once analysed', ours: time(warm), other: time(plain), ratio: warm / plain, target: { most: 0.1 } },
    {
      what: '  yaml keeping tokens and lines',
      ours: time(warm),
      other: time(placed),
      ratio: warm / placed,
      target: { most: 0.1 },
    },
    { what: '  the very first, nothing ready', ours: time(first), other: time(plain) },
  ];
}

/** The shipped server as a process: start, memory, and one design edited among 500 that are open. */
export async function serving(root: string): Promise<Row[]> {
  const design = readFileSync(join(root, 'extension/demo/hail_lidar.gainmodule.yaml'), 'utf8');
  const start = seconds();
  const alone = await Client.start(join(root, 'dist/server.cjs'));
  const started = seconds() - start;
  const beginEmpty = seconds();
  await new Promise((done) => spawn(process.execPath, ['-e', '0']).once('exit', done));
  const empty = seconds() - beginEmpty;
  await alone.open('file:///one.gainmodule.yaml', design);
  const single = await alone.editLatency('file:///one.gainmodule.yaml');
  const memory = alone.memory();
  await Promise.all(Array.from({ length: 500 }, (_, index) => alone.open(`file:///${index}.gainmodule.yaml`, design)));
  const among = await alone.editLatency('file:///one.gainmodule.yaml');
  const full = alone.memory();
  alone.stop();
  return [
    {
      what: 'server start to first answer',
      ours: time(started),
      other: time(empty),
      ratio: started / empty,
      target: { most: 5 },
    },
    {
      what: 'edit to problems, 500 designs open',
      ours: time(among),
      other: time(single),
      ratio: among / single,
      target: { most: 1.5 },
    },
    { what: 'memory, one design open', ours: `${memory} MB` },
    { what: 'memory, 501 designs open', ours: `${full} MB` },
  ];
}

/** As much of the protocol as is measured here. */
class Client {
  readonly #process;
  readonly #waiting: ((message: {
    method?: string;
    id?: number;
    params?: { uri?: string; version?: number };
  }) => void)[] = [];
  #version = 1;

  private constructor(server: string) {
    this.#process = spawn(process.execPath, [server, '--stdio']);
    let rest = Buffer.alloc(0);
    this.#process.stdout.on('data', (chunk: Buffer) => {
      rest = Buffer.concat([rest, chunk]);
      for (;;) {
        const head = /^Content-Length: (\d+)\r\n\r\n/.exec(rest.toString('latin1', 0, 40));
        if (head === null || rest.length < head[0].length + Number(head[1])) return;
        const body = rest.toString('utf8', head[0].length, head[0].length + Number(head[1]));
        rest = rest.subarray(head[0].length + Number(head[1]));
        for (const look of [...this.#waiting]) look(JSON.parse(body));
      }
    });
  }

  static async start(server: string): Promise<Client> {
    const client = new Client(server);
    client.#send({ id: 1, method: 'initialize', params: { processId: null, rootUri: null, capabilities: {} } });
    await client.#until(({ id }) => id === 1);
    client.#send({ method: 'initialized', params: {} });
    return client;
  }

  #send(message: object): void {
    const text = JSON.stringify({ jsonrpc: '2.0', ...message });
    this.#process.stdin.write(`Content-Length: ${Buffer.byteLength(text)}\r\n\r\n${text}`);
  }

  #until(
    isIt: (message: { method?: string; id?: number; params?: { uri?: string; version?: number } }) => boolean,
  ): Promise<void> {
    return new Promise((done) => {
      const look = (message: Parameters<typeof isIt>[0]): void => {
        if (!isIt(message)) return;
        this.#waiting.splice(this.#waiting.indexOf(look), 1);
        done();
      };
      this.#waiting.push(look);
    });
  }

  async open(uri: string, text: string): Promise<void> {
    const published = this.#until(({ method, params }) => method === 'giantpulse/analysed' && params?.uri === uri);
    this.#send({
      method: 'textDocument/didOpen',
      params: { textDocument: { uri, languageId: 'gainmodule', version: 1, text } },
    });
    await published;
  }

  /** Median of some edits, the pause for typing included. */
  async editLatency(uri: string): Promise<number> {
    const times: number[] = [];
    for (let edit = 0; edit < 15; edit++) {
      this.#version += 1;
      const version = this.#version;
      const published = this.#until(
        ({ method, params }) => method === 'giantpulse/analysed' && params?.uri === uri && params.version === version,
      );
      const begin = seconds();
      const start = { line: 0, character: 0 };
      this.#send({
        method: 'textDocument/didChange',
        params: { textDocument: { uri, version }, contentChanges: [{ range: { start, end: start }, text: '#\n' }] },
      });
      await published;
      times.push(seconds() - begin);
      await new Promise((resume) => setTimeout(resume, 60));
    }
    return times.sort((a, b) => a - b)[7] ?? Number.NaN;
  }

  memory(): number {
    const status = readFileSync(`/proc/${this.#process.pid}/status`, 'utf8');
    return Math.round(Number(/VmRSS:\s+(\d+) kB/.exec(status)?.[1]) / 1000);
  }

  stop(): void {
    this.#process.kill();
  }
}
