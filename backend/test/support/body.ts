import type { Response } from 'supertest';

/** The JSON of an answer as the shape that the test expects; the expectations that follow hold it to that. */
export function bodyOf<Shape = Record<string, unknown>>(answer: Response): Shape {
  return answer.body as Shape;
}

export interface ProblemBody {
  type: string;
  title: string;
  status: number;
  detail: string;
  instance: string;
  errors?: { pointer: string; message: string }[];
  rule?: string;
  retryAfter?: number;
}
