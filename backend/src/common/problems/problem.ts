/** The kinds of problem that the API answers with, each with its HTTP status and title (RFC 9457). */
export const PROBLEM_KINDS = {
  malformed: { status: 400, title: 'The request cannot be understood' },
  unauthenticated: { status: 401, title: 'Sign in first' },
  forbidden: { status: 403, title: 'This is not yours to do' },
  abandoned: { status: 408, title: 'The request was given up' },
  'not-found': { status: 404, title: 'Nothing here by that name' },
  stale: { status: 409, title: 'Somebody else has changed this meanwhile' },
  conflict: { status: 409, title: 'This is in the way of something that exists' },
  'too-large': { status: 413, title: 'The request is too large' },
  'unsupported-media': { status: 415, title: 'The content type is not understood' },
  clash: { status: 422, title: 'The request contradicts itself or the data' },
  throttled: { status: 429, title: 'Too many attempts' },
  unexpected: { status: 500, title: 'Something went wrong here' },
  unavailable: { status: 503, title: 'Not available at the moment' },
} as const;

export type ProblemKind = keyof typeof PROBLEM_KINDS;

/** One faulty field: a JSON pointer (RFC 6901) into the body, or `/name` of a query or path parameter. */
export interface FieldError {
  pointer: string;
  message: string;
}

export interface ProblemMembers {
  errors?: readonly FieldError[];
  /** The rule that forbids. */
  rule?: string;
  /** Seconds after which another attempt makes sense; also sent as Retry-After. */
  retryAfter?: number;
}

/** An expected failure, with words for the person who caused it. The exception filter turns it into the answer. */
export class Problem extends Error {
  override readonly name: string = 'Problem';

  constructor(
    readonly kind: ProblemKind,
    readonly detail: string,
    readonly members: ProblemMembers = {},
  ) {
    super(detail);
  }

  get status(): number {
    return PROBLEM_KINDS[this.kind].status;
  }
}
