/** One step of a working, as a builder would write it down to check it by hand. */
export interface WorkingStep {
  readonly what: string;
  readonly equation: string;
  /** The same with every number put in, with its unit. */
  readonly numbers: string;
  readonly result: string;
  readonly source?: string;
}
