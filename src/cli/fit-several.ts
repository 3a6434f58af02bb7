import { join } from 'node:path';
import type { Problem } from '../problem.ts';
import type { ReadStudy } from '../run/read-study-and-data.ts';
import { UNUSABLE } from './exit-status.ts';
import { findStudies } from './find-studies.ts';
import { finishMany } from './finish-many.ts';
import { fitMany, fitRepeats } from './fit-many.ts';
import { defaultFolder, studyName } from './fit-one.ts';
import type { FitCommandOptions } from './fit-options.ts';
import { DEEPEST, findEarlier, type ManyRecords } from './many-records.ts';
import type { ManyRun } from './many-run.ts';
import type { Progress } from './progress.ts';
import { showProblems } from './show-problems.ts';
import type { Terminal } from './terminal.ts';

interface Setting {
  readonly parameters: ReadonlyMap<string, string>;
  readonly progress: Progress;
  readonly terminal: Terminal;
  readonly options: FitCommandOptions;
}

/** `plumbrule fit STUDY …`: several studies, or all of a folder, each into its own folder, with an overview. */
export async function fitSeveral(paths: readonly string[], setting: Setting): Promise<number> {
  const problems: Problem[] = [];
  const studies = await findStudies(paths, (problem) => problems.push(problem));
  const title =
    paths.length === 1 ? `All studies of ${studyName(join(paths[0]!, 'study.yaml'))}` : 'Several studies';
  const out = setting.options.out ?? 'results';
  return many(title, out, DEEPEST, problems, setting, (options) => fitMany(studies, out, options));
}

/** A study that repeats for a variable, read already: its runs, each into its own folder, with an overview. */
export async function fitRepeated(path: string, read: ReadStudy, setting: Setting): Promise<number> {
  const out = setting.options.out ?? defaultFolder(path);
  const title = read.study?.title ?? studyName(path);
  return many(title, out, 1, [], setting, (options) => fitRepeats(path, read, out, options));
}

/** Where templates lie, by the names under which problems know them; a name of two files is left out. */
function templatesOf(runs: readonly ManyRun[]): Map<string, string> {
  const found = new Map<string, Set<string>>();
  for (const { templates } of runs) {
    for (const [name, path] of templates) found.set(name, (found.get(name) ?? new Set()).add(path));
  }
  return new Map([...found].flatMap(([name, paths]) => (paths.size === 1 ? [[name, [...paths][0]!]] : [])));
}

/** The runs, held against those of before where they are named, and what is said of all of them together. */
async function many(
  title: string,
  out: string,
  depth: number,
  problems: Problem[],
  { parameters, progress, terminal, options }: Setting,
  run: (options: Parameters<typeof fitMany>[2]) => Promise<ManyRun[]>,
): Promise<number> {
  let earlier: ManyRecords | null = null;
  if (options.against !== undefined) {
    earlier = await findEarlier(options.against, depth, (problem) => problems.push(problem));
    if (earlier === null) {
      progress.clear();
      await showProblems(problems, new Map(), options.problems, terminal);
      return UNUSABLE;
    }
  }
  const runs = await run({ parameters, onProgress: progress.show, earlier });
  progress.clear();
  const { junit } = options;
  const setting = {
    out,
    ...(junit === undefined ? {} : { junit }),
    templates: templatesOf(runs),
    terminal,
    options,
  };
  return finishMany(title, runs, earlier, problems, setting);
}
