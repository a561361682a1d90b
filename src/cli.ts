#!/usr/bin/env node
import { Command, CommanderError, Option } from 'commander';
import type { CommandOutcome, ScreenOptions } from './commands/screen.ts';
import type { SpacingsOptions } from './commands/spacings.ts';
import type { TemperaturesOptions } from './commands/temperatures.ts';
import { Interrupted } from './commands/write-results.ts';
import { InputError, wordIssues } from './issue.ts';
import { version } from './output/version.ts';

const OK = 0;
const A_CHECK_FAILS = 1;
const BAD_INPUT = 2;
const UNEXPECTED = 3;
/** What shells report of a program that an interrupt ended. */
const INTERRUPTED = 130;

process.exitCode = await main(process.argv);

async function main(argv: readonly string[]): Promise<number> {
  let code = OK;
  const program = commands(({ lines, warnings, fails }, strict) => {
    for (const warning of warnings) console.error(`Warning: ${warning}`);
    for (const line of lines) console.log(line);
    if (strict && fails) code = A_CHECK_FAILS;
  });
  let allErrors = false;
  for (const command of program.commands) {
    command.option('--all-errors', 'tell every error in the input, not the first ten');
  }
  program.hook('preAction', (_, command) => {
    allErrors = command.opts().allErrors ?? false;
  });
  try {
    await program.parseAsync(argv);
    return code;
  } catch (error) {
    return explain(error, allErrors);
  }
}

function commands(report: (outcome: CommandOutcome, strict: boolean) => void): Command {
  const program = new Command('daystrain')
    .description('Screens thermally cycled fastened connections for fatigue.')
    .version(version)
    .exitOverride();
  program
    .command('start')
    .description('Write a commented job with an invented record, ready to be screened.')
    .argument('<dir>', 'the folder for it')
    .action(async (directory: string) => {
      const { startCommand } = await import('./commands/start.ts');
      report(await startCommand(directory), false);
    });
  program
    .command('check')
    .description('Read a job and say in words what was understood; nothing is written.')
    .argument('<job>', 'the job file, or a folder that holds job.yaml')
    .action(async (job: string) => {
      const { checkCommand } = await import('./commands/check.ts');
      report(await checkCommand(job), false);
    });
  program
    .command('screen')
    .description('Screen every connection of a job and write tables, charts and a summary.')
    .argument('<job>', 'the job file, or a folder that holds job.yaml')
    .option('--out <dir>', "folder for the results (default: reports/ and the job's folder name)")
    .addOption(
      new Option(
        '--charts <which>',
        'charts of the governing run and an overview, of all runs, or none',
      )
        .choices(['governing', 'all', 'none'])
        .default('governing'),
    )
    .option(
      '--write-remedied <file>',
      'write the job with its remedies in to a job file of its own',
    )
    .addOption(
      new Option('--no-remedies', 'look for no remedies where a run fails').conflicts(
        'writeRemedied',
      ),
    )
    .option('--strict', 'exit with 1 if any check fails')
    .action(async (job: string, options: ScreenOptions & { strict?: boolean }) => {
      const { screenCommand } = await import('./commands/screen.ts');
      report(await screenCommand(job, options), options.strict ?? false);
    });
  program
    .command('temperatures')
    .description('Show the zones alone: tables of every sample and day, a summary and charts.')
    .argument('<job>', 'the job file, or a folder that holds job.yaml')
    .option(
      '--out <dir>',
      "folder for the results (default: reports/, the job's name and -temperatures)",
    )
    .addOption(
      new Option('--charts <which>', 'charts of all zones, or none')
        .choices(['all', 'none'])
        .default('all'),
    )
    .action(async (job: string, options: TemperaturesOptions) => {
      const { temperaturesCommand } = await import('./commands/temperatures.ts');
      report(await temperaturesCommand(job, options), false);
    });
  addSpacings(program, report);
  return program;
}

function addSpacings(
  program: Command,
  report: (outcome: CommandOutcome, strict: boolean) => void,
): void {
  program
    .command('spacings')
    .description(
      'Compare spacings of the fasteners: every check at each, and the widest that passes.',
    )
    .argument('<job>', 'the job file, or a folder that holds job.yaml')
    .option('--at <spacing...>', 'spacings to try, such as --at "300 mm" "600 mm"')
    .option('--from <spacing>', 'the closest of evenly stepped spacings')
    .option('--to <spacing>', 'the widest of them')
    .option('--by <step>', 'the step between them')
    .option('--runs <id...>', 'the runs to compare (default: all)')
    .addOption(
      new Option(
        '--fixed <which...>',
        "which fasteners are fixed (default: each run's own)",
      ).choices(['all', 'first', 'middle', 'none']),
    )
    .option('--pieces <number...>', 'cut each run into so many pieces by expansion joints')
    .option('--piece <length...>', 'cut each run into pieces no longer than this, joint to joint')
    .option(
      '--out <dir>',
      "folder for the results (default: reports/, the job's name and -spacings)",
    )
    .addOption(
      new Option('--charts <which>', 'charts of all runs, or none')
        .choices(['all', 'none'])
        .default('all'),
    )
    .option('--strict', 'exit with 1 if a run passes at none of the spacings')
    .action(async (job: string, options: SpacingsOptions & { strict?: boolean }) => {
      const { spacingsCommand } = await import('./commands/spacings.ts');
      report(await spacingsCommand(job, options), options.strict ?? false);
    });
}

/** Says on stderr what went wrong, and gives the exit code for it. */
function explain(error: unknown, allErrors: boolean): number {
  // The option parser has already printed its own message, help or version.
  if (error instanceof CommanderError) return error.exitCode === 0 ? OK : BAD_INPUT;
  if (error instanceof InputError) {
    for (const line of wordIssues(error.issues, allErrors)) console.error(line);
    const count = error.issues.length;
    console.error(`${count === 1 ? '1 error' : `${count} errors`}. Nothing was written.`);
    return BAD_INPUT;
  }
  if (error instanceof Interrupted) {
    console.error(error.message);
    return INTERRUPTED;
  }
  const message = error instanceof Error ? error.message : String(error);
  console.error(`daystrain failed unexpectedly (${message}). Please report this as a fault.`);
  if (process.env.DAYSTRAIN_DEBUG && error instanceof Error) console.error(error.stack);
  return UNEXPECTED;
}
