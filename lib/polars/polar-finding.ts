/** Something wrong in a polar's file, said so that the owner can mend it. Lines count from 1. */
export interface PolarFinding {
  readonly line: number;
  readonly column?: string;
  readonly message: string;
}
