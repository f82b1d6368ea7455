/** A problem document as tests read it: `answer.body as ProblemBody`. */
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
