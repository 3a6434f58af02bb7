import { Command, CommanderError, Option } from 'commander';
import { packageVersion } from '../package-file.ts';
import type { Problem } from '../problem.ts';
import type { StudyOptions } from './common-options.ts';
import type { CompareCommandOptions } from './compared-files.ts';
import type { DraftCommandOptions } from './draft.ts';
import { OWN_FAULT, UNUSABLE } from './exit-status.ts';
import type { FitCommandOptions } from './fit-options.ts';
import type { PredictCommandOptions } from './predict.ts';
import type { RenderCommandOptions } from './render.ts';
import { showProblems } from './show-problems.ts';
import type { Terminal } from './terminal.ts';
import type { VerifyCommandOptions } from './verify.ts';

/**
 * Runs one command line (without the program's own name) and gives its exit status. Commands are loaded
 * when they are called for, so that `--help` costs next to nothing.
 */
export async function runCommandLine(args: readonly string[], terminal: Terminal): Promise<number> {
  let status = 0;
  const program = commands(terminal, (found) => {
    status = found;
  });
  try {
    await program.parseAsync([...args], { from: 'user' });
    return status;
  } catch (fault) {
    if (fault instanceof CommanderError) return await misused(fault, program, args, terminal);
    return ownFault(fault, terminal);
  }
}

function commands(terminal: Terminal, ended: (status: number) => void): Command {
  const program = new Command('plumbrule')
    .description(
      'Runs declared multiple-regression studies: fits every candidate, chooses one by the declared rule,\nexamines it, predicts, records and reports.',
    )
    .version(packageVersion(), '--version', 'print the version')
    .helpOption('--help', 'print help for a command')
    .helpCommand(false)
    .showSuggestionAfterError(true)
    .exitOverride()
    .configureOutput({
      writeOut: terminal.out,
      // Faults are printed once, by `misused`.
      writeErr: () => {},
      getOutHelpWidth: () => terminal.width,
    });

  const problems = () =>
    new Option(
      '--problems <form>',
      'print problems as text, or as JSON on standard output and nothing else there',
    )
      .choices(['text', 'json'])
      .default('text');
  const given = () =>
    new Option('--with <name=value>', 'a value for a parameter of the study; may be repeated')
      .argParser((text: string, before: string[]) => [...before, text])
      .default([], 'the defaults that the study declares');
  const quiet = () => new Option('--quiet', 'print problems only');

  program
    .command('draft')
    .description('write a first study file from a data file')
    .argument('<data>', 'the data file')
    .requiredOption('--response <name>', 'the column to be explained')
    .option('--out <file>', 'where to write (default: standard output)')
    .addOption(quiet())
    .addOption(problems())
    .action(async (data: string, options: DraftCommandOptions) => {
      const { draftCommand } = await import('./draft.ts');
      ended(await draftCommand(data, options, terminal));
    });

  program
    .command('check')
    .description('check a study and its data, and fit nothing')
    .argument('<study>', 'the study file')
    .addOption(given())
    .addOption(quiet())
    .addOption(problems())
    .action(async (study: string, options: StudyOptions) => {
      const { checkCommand } = await import('./check.ts');
      ended(await checkCommand(study, options, terminal));
    });

  program
    .command('fit')
    .description('run the whole study and write its record, reports and tables')
    .argument('<study...>', 'the study file; several, or folders of studies, are run one by one')
    .option('--out <folder>', 'where to write (default: results/ and the name of the study)')
    .option(
      '--against <earlier>',
      'an earlier record, or the folder of its results or of those of many runs, to compare with',
    )
    .addOption(given())
    .option('--junit <file>', 'write the acceptance criteria as tests for continuous integration (JUnit XML)')
    .addOption(quiet())
    .addOption(problems())
    .action(async (studies: string[], options: FitCommandOptions) => {
      const { fitCommand } = await import('./fit.ts');
      ended(await fitCommand(studies, options, terminal));
    });

  program
    .command('compare')
    .description('say what is different between two records, and what moved each coefficient')
    .argument('<earlier>', 'the earlier record, or the folder of its results, or of those of many runs')
    .argument('<later>', 'the later one')
    .option('--out <folder>', 'where to write (default: nothing is written)')
    .addOption(
      new Option(
        '--format <format>',
        'one format only; without --out it is printed (default: all three are written)',
      ).choices(['html', 'markdown', 'json']),
    )
    .option('--template <file>', 'a template of your own for that format')
    .addOption(quiet())
    .addOption(problems())
    .action(async (earlier: string, later: string, options: CompareCommandOptions) => {
      const { compareCommand } = await import('./compare.ts');
      ended(await compareCommand(earlier, later, options, terminal));
    });

  program
    .command('predict')
    .description('predict rows of a file from a record alone')
    .argument('<record>', 'the record file, record.json')
    .argument('<rows>', 'a CSV file of rows, or - for standard input')
    .option('--out <file>', 'where to write (default: standard output)')
    .addOption(new Option('--format <format>', 'how to write').choices(['csv', 'json']).default('csv'))
    .option('--interval <confidence>', 'confidence of the intervals (default: that of the study)')
    .option('--total', 'give the total of all rows')
    .option('--total-by <variable>', 'give totals by a variable of the model or a column of the file')
    .addOption(quiet())
    .addOption(problems())
    .action(async (record: string, rows: string, options: PredictCommandOptions) => {
      const { predictCommand } = await import('./predict.ts');
      ended(await predictCommand(record, rows, options, terminal));
    });

  program
    .command('verify')
    .description('run the study of a record again; every number must come back')
    .argument('<record>', 'the record file, record.json')
    .option(
      '--study <file>',
      'the study file or its folder (default: looked for beside the record, above it and here)',
    )
    .option('--tolerance <relative>', 'relative difference passed over (default: 0, to the last bit)')
    .addOption(quiet())
    .addOption(problems())
    .action(async (record: string, options: VerifyCommandOptions) => {
      const { verifyCommand } = await import('./verify.ts');
      ended(await verifyCommand(record, options, terminal));
    });

  program
    .command('render')
    .description('write the reports of a record again, without its data')
    .argument('<record>', 'the record file, record.json')
    .option('--out <folder>', 'where to write (default: the folder of the record)')
    .addOption(
      new Option('--format <format>', 'one format only (default: those that the study asks for)').choices([
        'html',
        'markdown',
      ]),
    )
    .option('--template <file>', 'a template of your own for that format')
    .addOption(quiet())
    .addOption(problems())
    .action(async (record: string, options: RenderCommandOptions) => {
      const { renderCommand } = await import('./render.ts');
      ended(await renderCommand(record, options, terminal));
    });

  program.addHelpText(
    'after',
    '\nExit status: 0 done; 1 done, but an acceptance criterion was missed, no candidate was admitted or a\nrecord did not come back; 2 the study, the data or the command line cannot be used;\n3 a fault of the program.\n',
  );
  return program;
}

/** Help and version come here too: the parser ends each of them by throwing. */
async function misused(
  fault: CommanderError,
  program: Command,
  args: readonly string[],
  terminal: Terminal,
): Promise<number> {
  if (fault.exitCode === 0) return 0;
  if (fault.code === 'commander.help') {
    terminal.err(program.helpInformation());
    return UNUSABLE;
  }
  const [first, ...rest] = fault.message.replace(/^error: /, '').split('\n');
  const suggestion = rest.join(' ').match(/\(Did you mean (?:one of )?(.*?)\??\)/)?.[1];
  const named = program.commands.some((command) => command.name() === args[0]);
  const problem: Problem = {
    code: 'command_unusable',
    severity: 'error',
    place: { kind: 'command' },
    message: sentence(first ?? 'The command line cannot be understood'),
    hint:
      suggestion === undefined
        ? `See plumbrule ${named ? `${args[0]} ` : ''}--help.`
        : `Did you mean ${suggestion}?`,
  };
  await showProblems([problem], new Map(), jsonAsked(args) ? 'json' : 'text', terminal);
  return UNUSABLE;
}

function jsonAsked(args: readonly string[]): boolean {
  return args.includes('--problems=json') || args[args.indexOf('--problems') + 1] === 'json';
}

function sentence(text: string): string {
  const raised = text.charAt(0).toUpperCase() + text.slice(1);
  return raised.endsWith('.') ? raised : `${raised}.`;
}

function ownFault(fault: unknown, terminal: Terminal): number {
  const said = fault instanceof Error ? `${fault.name}: ${fault.message}` : String(fault);
  terminal.err(`plumbrule failed through a fault of its own; nothing was written. ${said}\n`);
  if (process.env.PLUMBRULE_DEBUG === '1') {
    terminal.err(`${fault instanceof Error ? fault.stack : said}\n`);
  } else {
    terminal.err('Set PLUMBRULE_DEBUG=1 to see where it happened.\n');
  }
  return OWN_FAULT;
}
