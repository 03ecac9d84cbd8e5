import { ExpectedError } from '@/lib/errors';

/** An expected error of the HTTP edge alone, which no use case knows: too large, wrong content type. */
export class ProblemError extends ExpectedError {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
  ) {
    super(message);
  }
}
