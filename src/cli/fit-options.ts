import type { StudyOptions } from './common-options.ts';

export interface FitCommandOptions extends StudyOptions {
  readonly out?: string;
  /** An earlier record, or the folder of its results, to compare with. */
  readonly against?: string;
  /** Where the acceptance criteria go as JUnit XML. */
  readonly junit?: string;
}
