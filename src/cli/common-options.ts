/** Options that every command has, as the command line gives them. */
export interface CommonOptions {
  readonly quiet?: boolean;
  readonly problems: 'text' | 'json';
}

/** Options of the commands that read a study. */
export interface StudyOptions extends CommonOptions {
  /** Each "NAME=VALUE". */
  readonly with?: readonly string[];
}
