import { runCommand } from './command.ts';
import { nodeWorld } from './node-world.ts';

// Whatever ends the process early must not look like success.
process.exitCode = 2;
void runCommand(process.argv.slice(2), nodeWorld()).then((code) => {
  process.exitCode = code;
});
