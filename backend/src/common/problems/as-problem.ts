import { HttpException } from '@nestjs/common';
import { Problem, PROBLEM_KINDS, type ProblemKind } from './problem';

const DETAIL_BY_KIND: Partial<Record<ProblemKind, string>> = {
  malformed: 'The body is not valid JSON, or the address is not well formed.',
  'not-found': 'There is no such address in this application.',
  'too-large': 'Send less at once.',
  'unsupported-media': 'Send JSON as application/json.',
};

/**
 * Any error as a problem. What the framework refuses keeps its status and gets words of ours; everything unknown
 * becomes a neutral 500, so that nothing of the inside leaves by an error message.
 */
export function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  const status = statusOf(error);
  const kind = kindOf(status);
  return new Problem(
    kind,
    DETAIL_BY_KIND[kind] ?? 'It has been logged; try again, and tell your administrator if it stays.',
  );
}

function statusOf(error: unknown): number {
  if (error instanceof HttpException) return error.getStatus();
  // body-parser and express mark what the client did wrong by `expose` and a status.
  if (error instanceof Error && 'expose' in error && error.expose === true && 'status' in error) {
    return typeof error.status === 'number' ? error.status : 500;
  }
  return error instanceof URIError ? 400 : 500;
}

function kindOf(status: number): ProblemKind {
  const kinds = Object.keys(PROBLEM_KINDS).filter((kind): kind is ProblemKind => kind in PROBLEM_KINDS);
  const known = kinds.find((kind) => PROBLEM_KINDS[kind].status === status);
  return known ?? (status >= 400 && status < 500 ? 'malformed' : 'unexpected');
}
