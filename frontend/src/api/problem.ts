import { isAxiosError } from 'axios';

export interface FieldProblem {
  /** JSON pointer into the body that was sent, for example `/duty/window/lower`. */
  pointer: string;
  message: string;
}

interface ProblemDocument {
  type?: unknown;
  title?: unknown;
  status?: unknown;
  detail?: unknown;
  instance?: unknown;
  rule?: unknown;
  errors?: unknown;
}

const text = (value: unknown): string | undefined =>
  typeof value === 'string' && value !== '' ? value : undefined;

function fieldProblems(errors: unknown): FieldProblem[] {
  if (!Array.isArray(errors)) return [];
  return errors.flatMap((entry: unknown) => {
    if (typeof entry !== 'object' || entry === null) return [];
    const { pointer, message } = entry as { pointer?: unknown; message?: unknown };
    return typeof pointer === 'string' && typeof message === 'string' ? [{ pointer, message }] : [];
  });
}

/** A problem document (RFC 9457) that the server answered, or the same shape for a server that did not answer. */
export class Problem extends Error {
  constructor(
    /** The stable last part of `urn:resistry:problem:<kind>`; `unreachable` when no answer came. */
    readonly kind: string,
    readonly status: number,
    readonly title: string,
    readonly detail: string | undefined,
    /** To be quoted to whoever reads the server's log. */
    readonly requestId: string | undefined,
    readonly fields: FieldProblem[],
    /** The rule that forbade it, with status 403. */
    readonly rule: string | undefined,
  ) {
    super(detail ?? title);
    this.name = 'Problem';
  }

  /** The message of one field, by its JSON pointer. */
  at(pointer: string): string | undefined {
    return this.fields.find((field) => field.pointer === pointer)?.message;
  }
}

function problemOfDocument(document: ProblemDocument, status: number): Problem {
  return new Problem(
    text(document.type)?.split(':').pop() ?? 'unexpected',
    status,
    text(document.title) ?? 'The server answered with an error',
    text(document.detail),
    text(document.instance),
    fieldProblems(document.errors),
    text(document.rule),
  );
}

/** Turns whatever was thrown by a request into a Problem. */
export function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (isAxiosError(error) && error.response !== undefined) {
    const body: unknown = error.response.data;
    const document = typeof body === 'object' && body !== null ? (body as ProblemDocument) : {};
    return problemOfDocument(document, error.response.status);
  }
  if (isAxiosError(error)) {
    return new Problem(
      'unreachable',
      0,
      'The server did not answer',
      'What you entered is still here. Check the connection and try again.',
      undefined,
      [],
      undefined,
    );
  }
  const detail = error instanceof Error ? error.message : undefined;
  return new Problem('unexpected', 0, 'Something went wrong in this page', detail, undefined, [], undefined);
}
