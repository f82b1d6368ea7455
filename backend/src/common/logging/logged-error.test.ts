import { DatabaseError, UniqueConstraintError } from 'sequelize';
import pino from 'pino';
import { loggedError } from './logged-error';

/** The lines that a logger with this serialiser writes about an error. */
function linesAbout(error: Error): string {
  let lines = '';
  const logger = pino(
    { serializers: { err: pino.stdSerializers.wrapErrorSerializer(loggedError) } },
    { write: (line: string) => (lines += line) },
  );
  logger.error({ err: error }, 'failed');
  return lines;
}

describe('loggedError', () => {
  it('keeps type, message and stack, the cause included', () => {
    const lines = linesAbout(new Error('outside', { cause: new Error('inside') }));
    expect(lines).toMatch(/"type":"Error","message":"outside: inside","stack":"Error: outside/);
    expect(lines).toContain('caused by: Error: inside');
  });

  it('writes down no bound value and no model', () => {
    const parent = Object.assign(new Error('SQLITE_CONSTRAINT'), {
      sql: 'INSERT',
      parameters: { 1: '$2b$10$hash' },
    });
    expect(linesAbout(new DatabaseError(parent))).not.toContain('$2b$');
    const clash = new UniqueConstraintError({ fields: { passwordHash: '$2b$10$hash' } });
    expect(linesAbout(clash)).not.toContain('$2b$');
  });
});
