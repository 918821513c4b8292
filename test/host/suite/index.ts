import { env, version } from 'vscode';
import { editing } from './editing.ts';
import { say } from './harness.ts';
import { problems } from './problems.ts';

/** VS Code calls this in its extension host. The closing line is the only proof that the suite ran to its end. */
export async function run(): Promise<void> {
  say(`VS Code ${version} on ${env.appHost}, Node ${process.version}`);
  let passed = 0;
  let failed = 0;
  for (const { name, run: test } of [...editing, ...problems]) {
    const start = performance.now();
    try {
      await test();
      passed += 1;
      say(`ok - ${name} (${(performance.now() - start).toFixed(0)} ms)`);
    } catch (error) {
      failed += 1;
      say(`not ok - ${name}: ${error instanceof Error ? error.stack : String(error)}`);
    }
  }
  say(`${passed} passed, ${failed} failed`);
  if (failed > 0) throw new Error(`${failed} failed`);
}
