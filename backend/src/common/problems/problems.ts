import { type FieldError, Problem } from './problem';

/** 400: unknown, missing or wrongly typed fields. */
export class MalformedProblem extends Problem {
  constructor(
    errors: readonly FieldError[],
    detail = 'Some fields are missing, unknown or of the wrong kind.',
  ) {
    super('malformed', detail, { errors });
  }
}

/** 401: nobody is signed in, or the token is expired or forged. */
export class UnauthenticatedProblem extends Problem {
  constructor(detail = 'Sign in to go on; the access token is missing, expired or not valid.') {
    super('unauthenticated', detail);
  }
}

/** 403: signed in, but a rule forbids; `rule` names it. */
export class ForbiddenProblem extends Problem {
  constructor(rule: string, detail: string) {
    super('forbidden', detail, { rule });
  }
}

/** 404 */
export class NotFoundProblem extends Problem {
  constructor(detail: string) {
    super('not-found', detail);
  }
}

/** 409: the version that the edit was made on is no longer the current one. */
export class StaleEditProblem extends Problem {
  constructor(subject: string) {
    super('stale', `${subject} has been changed since you opened it. Load it again and repeat your change.`);
  }
}

/** 409: something of that name exists already. */
export class ConflictProblem extends Problem {
  constructor(detail: string, errors?: readonly FieldError[]) {
    super('conflict', detail, { errors });
  }
}

/** 422: well-formed, but fields contradict each other or what is stored. */
export class ClashProblem extends Problem {
  constructor(detail: string, errors: readonly FieldError[] = []) {
    super('clash', detail, { errors });
  }
}

/** 429: `retryAfter` in seconds. */
export class ThrottledProblem extends Problem {
  constructor(detail: string, retryAfter: number) {
    super('throttled', detail, { retryAfter: Math.max(1, Math.ceil(retryAfter)) });
  }
}
