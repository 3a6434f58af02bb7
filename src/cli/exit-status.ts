/** What the exit status says. */
export const DONE = 0;
/** Done, but an acceptance criterion was missed, or no candidate was admitted. */
export const NOT_ACCEPTED = 1;
/** The study, the data or the command line cannot be used. */
export const UNUSABLE = 2;
/** A fault of the program's own. */
export const OWN_FAULT = 3;
