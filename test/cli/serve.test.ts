import { type ChildProcessWithoutNullStreams, spawn } from 'node:child_process';
import { once } from 'node:events';
import { rmSync } from 'node:fs';
import { afterAll, describe, expect, test } from 'vitest';
import { bundle, folderWith, giantpulse } from './command.ts';

const folder = folderWith({});
const started: ChildProcessWithoutNullStreams[] = [];
afterAll(() => {
  for (const process of started) process.kill();
  rmSync(folder, { recursive: true });
});

/** The command as an editor starts it; `said` waits for a text in its answers, which must come. */
function startServing() {
  const server = spawn(process.execPath, [bundle, 'serve', '--stdio'], { cwd: folder });
  started.push(server);
  let output = '';
  server.stdout.on('data', (chunk: Buffer) => {
    output += chunk.toString();
  });
  const exited = once(server, 'exit').then(([code]: unknown[]) => code);
  return {
    exited,
    stdin: server.stdin,
    async said(text: string): Promise<void> {
      while (!output.includes(text)) await Promise.race([once(server.stdout, 'data'), failAt(exited, text)]);
    },
  };
}

async function failAt(exited: Promise<unknown>, text: string): Promise<never> {
  throw new Error(`ended with ${await exited} before it said ${text}`);
}

function framed(message: object): string {
  const body = JSON.stringify({ jsonrpc: '2.0', ...message });
  return `Content-Length: ${Buffer.byteLength(body)}\r\n\r\n${body}`;
}

const params = { processId: null, rootUri: null, capabilities: {} };
const initialize = framed({ id: 1, method: 'initialize', params });

describe('giantpulse serve', () => {
  test('without a transport says which one to name, and could not run', () => {
    const { status, stdout, stderr } = giantpulse(folder, 'serve');
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr).toContain("required option '--stdio'");
  });

  test('refuses other transports and files', () => {
    expect(giantpulse(folder, 'serve', '--stdio', '--port=7').status).toBe(2);
    expect(giantpulse(folder, 'serve', '--stdio', 'a.gainmodule.yaml').status).toBe(2);
  });

  test('explains itself', () => {
    const { status, stdout } = giantpulse(folder, 'serve', '--help');
    expect(status).toBe(0);
    expect(stdout).toContain('--stdio');
    expect(giantpulse(folder, '--help').stdout).toMatch(/serve .*language server/);
  });

  test('ends with exit code 0 when its client says so', async () => {
    const { stdin, said, exited } = startServing();
    stdin.write(initialize);
    await said('"hoverProvider":true');
    stdin.write(framed({ id: 2, method: 'shutdown' }));
    await said('"id":2');
    stdin.write(framed({ method: 'exit' }));
    expect(await exited).toBe(0);
  });

  test('ends when its client has gone; without the goodbye that is a failure', async () => {
    const { stdin, said, exited } = startServing();
    stdin.write(initialize);
    await said('"hoverProvider":true');
    stdin.end();
    expect(await exited).toBe(1);
  });

  test('outlives what is no message', async () => {
    const { stdin, said } = startServing();
    stdin.write('Content-Length: 7\r\n\r\nnothing');
    stdin.write(initialize);
    await said('"hoverProvider":true');
  });
});
