import { Command, CommanderError, Option } from 'commander';
import { check } from './check.ts';
import { predict } from './predict.ts';
import type { World } from './world.ts';

/** Could not run: no such file, bad option, internal failure. */
export const COULD_NOT_RUN = 2;

/** Runs `giantpulse` with its arguments; the exit code is the outcome. Results go to stdout, all else to stderr. */
export async function runCommand(args: readonly string[], world: World): Promise<number> {
  let code = 0;
  const program = new Command('giantpulse')
    .description('Predicts the pulse of a Q-switched laser from its design file, and checks it.')
    .version(world.version, '-V, --version', 'print the version')
    .helpOption('-h, --help', 'print this help')
    .helpCommand(false)
    .configureOutput({ writeOut: world.out, writeErr: world.err })
    .exitOverride()
    .addHelpText(
      'after',
      '\nExit codes: 0 fine (predict: a pulse), 1 errors found (predict: no pulse),\n2 could not run.\n\nPredictions are no measurements and no interlock; local codes, the laser safety\nofficer and licensed practice decide.',
    );
  program
    .command('predict')
    .description('print the predicted pulse of one design')
    .argument('<file>', 'a *.gainmodule.yaml file')
    .addOption(new Option('-f, --format <format>', 'form of the result').choices(['text', 'json']).default('text'))
    .action((file: string, options: { readonly format: string }) => {
      code = predict(file, options.format === 'json' ? 'json' : 'text', world);
    });
  program
    .command('check')
    .description('print what is wrong with designs, a line each')
    .argument('<files...>', 'files, folders or patterns')
    .action(async (files: string[]) => {
      code = await check(files, world);
    });
  program
    .command('serve')
    .description('run the language server for an editor')
    .requiredOption('--stdio', 'speak over standard input and output')
    .action(() => world.serve());
  try {
    await program.parseAsync(args, { from: 'user' });
    return code;
  } catch (error) {
    if (error instanceof CommanderError) return error.exitCode === 0 ? 0 : COULD_NOT_RUN;
    world.err(`giantpulse failed: ${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
    return COULD_NOT_RUN;
  }
}
