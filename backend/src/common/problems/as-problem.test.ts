import { BadRequestException, NotFoundException, PayloadTooLargeException } from '@nestjs/common';
import { asProblem } from './as-problem';
import { StaleEditProblem } from './problems';

describe('asProblem', () => {
  it('leaves a problem as it is', () => {
    const problem = new StaleEditProblem('The part');
    expect(asProblem(problem)).toBe(problem);
  });

  it.each([
    [new NotFoundException('Cannot GET /x'), 'not-found', 404],
    [new BadRequestException('Unexpected token'), 'malformed', 400],
    [new PayloadTooLargeException(), 'too-large', 413],
    [Object.assign(new Error('request entity too large'), { expose: true, status: 413 }), 'too-large', 413],
    [new URIError('URI malformed'), 'malformed', 400],
    [Object.assign(new Error('teapot'), { expose: true, status: 418 }), 'malformed', 400],
  ])('gives words of ours to %s', (error, kind, status) => {
    const problem = asProblem(error);
    expect(problem).toMatchObject({ kind, status });
    expect(problem.detail).not.toContain(error.message);
  });

  it.each([new Error('SQLITE_CONSTRAINT: users.password_hash'), 'thrown text', undefined])(
    'tells nothing of what it does not know: %p',
    (error) => {
      const problem = asProblem(error);
      expect(problem).toMatchObject({ kind: 'unexpected', status: 500 });
      expect(problem.detail).not.toMatch(/SQLITE|password|thrown/);
    },
  );
});
