import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { PROBLEM_KINDS, type Problem } from './problem';

export class FieldErrorDocument {
  @ApiProperty({ description: 'JSON pointer (RFC 6901) to the faulty field' })
  pointer: string;

  @ApiProperty()
  message: string;
}

/** A problem as it goes over the wire (RFC 9457, `application/problem+json`). */
export class ProblemDocument {
  @ApiProperty({ example: 'urn:resistry:problem:malformed' })
  type: string;

  @ApiProperty()
  title: string;

  @ApiProperty()
  status: number;

  @ApiProperty()
  detail: string;

  @ApiProperty({ description: 'Identifies this request in the log' })
  instance: string;

  @ApiPropertyOptional({ type: [FieldErrorDocument] })
  errors?: FieldErrorDocument[];

  @ApiPropertyOptional({ description: 'The rule that forbids' })
  rule?: string;

  @ApiPropertyOptional({ description: 'Seconds after which another attempt makes sense' })
  retryAfter?: number;

  static of(problem: Problem, requestId: string): ProblemDocument {
    const { errors, rule, retryAfter } = problem.members;
    const document = new ProblemDocument();
    document.type = `urn:resistry:problem:${problem.kind}`;
    document.title = PROBLEM_KINDS[problem.kind].title;
    document.status = problem.status;
    document.detail = problem.detail;
    document.instance = `urn:uuid:${requestId}`;
    if (errors !== undefined && errors.length > 0) document.errors = [...errors];
    if (rule !== undefined) document.rule = rule;
    if (retryAfter !== undefined) document.retryAfter = retryAfter;
    return document;
  }
}
