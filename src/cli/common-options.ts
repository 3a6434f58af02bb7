/** Options that every command has, as the command line gives them. */
export interface CommonOptions {
  readonly quiet?: boolean;
  readonly problems: 'text' | 'json';
}
