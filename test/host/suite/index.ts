import { env, version } from 'vscode';
import { editing } from './editing.ts';
import { features } from './features.ts';
import { say, writeReport } from './harness.ts';
import { problems } from './problems.ts';
import { surroundings } from './surroundings.ts';
import { virtualFiles } from './virtual-files.ts';

/** VS Code calls this in its extension host. The closing line is the only proof that the suite ran to its end. */
export async function run(): Promise<void> {
  const worker = !('process' in globalThis) && 'WorkerGlobalScope' in globalThis;
  say(`VS Code ${version} on ${env.appHost}, extensions in ${worker ? 'a web worker' : 'a process of Node'}`);
  let passed = 0;
  let failed = 0;
  for (const { name, run: test } of [...editing, ...problems, ...features, ...surroundings, ...virtualFiles]) {
    const start = performance.now();
    try {
      await test();
      passed += 1;
      say(`ok - ${name} (${(performance.now() - start).toFixed(0)} ms)`);
    } catch (error) {
      failed += 1;
      // Nothing that follows could work, and each would wait for its time to run out.
      const hopeless = failed === 1 && passed === 0;
      say(`not ok - ${name}: ${error instanceof Error ? error.stack : String(error)}`);
      if (hopeless) break;
    }
  }
  say(`${passed} passed, ${failed} failed`);
  await writeReport();
  if (failed > 0) throw new Error(`${failed} failed`);
}
