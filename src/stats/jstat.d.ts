/** The function used here; the package has no types of its own. */
declare module 'jstat' {
  export interface JStat {
    readonly tukey: {
      /** The q below which the studentised range of k means on df degrees of freedom falls with probability p. */
      inv(p: number, k: number, df: number): number;
    };
  }
}
