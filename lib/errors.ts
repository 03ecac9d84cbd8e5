/**
 * The expected errors. A use case throws one; lib/web turns it into a problem answer or a message on the
 * page. Anything else is a fault of ours: logged with an id and answered plainly.
 */
export interface FieldProblem {
  /** JSON pointer of the field, RFC 6901: "/boat/spanM". */
  readonly pointer: string;
  readonly message: string;
}

export abstract class ExpectedError extends Error {
  abstract readonly status: number;
  abstract readonly code: string;
}

/** Input that is not well formed (400) or well formed but impossible (422). */
export class InvalidInputError extends ExpectedError {
  readonly code = 'invalid-input';
  constructor(
    readonly fields: readonly FieldProblem[],
    readonly status: 400 | 422 = 400,
  ) {
    super(fields.map((field) => field.message).join(' '));
  }
}

export class NotSignedInError extends ExpectedError {
  readonly status = 401;
  readonly code = 'not-signed-in';
  constructor() {
    super('Sign in, or send a personal token.');
  }
}

/** Signed in, sees the thing, may not do this to it. */
export class NotAllowedError extends ExpectedError {
  readonly status = 403;
  readonly code = 'not-allowed';
  constructor(message = 'Your role on this boat does not allow this.') {
    super(message);
  }
}

/** Absent, or not to be known of: foreign ids answer the same. */
export class NotFoundError extends ExpectedError {
  readonly status = 404;
  readonly code = 'not-found';
  constructor(what = 'That') {
    super(`${what} is not here, or is not shared with you.`);
  }
}

/** Somebody saved in between. */
export class ConflictError extends ExpectedError {
  readonly status = 409;
  readonly code = 'conflict';
}

export class TooManyTriesError extends ExpectedError {
  readonly status = 429;
  readonly code = 'too-many-tries';
  constructor(readonly retryAfterSeconds: number) {
    super(`Too many tries. Wait ${Math.ceil(retryAfterSeconds / 60)} min and try again.`);
  }
}
