/** What the log keeps of an error. Its type is what pino's own serialiser makes of it. */
export interface LoggedError {
  type: string;
  message: string;
  stack: string;
}

/**
 * Leaves out whatever else hangs on an error: Sequelize's carry the bound values and the whole model, with password
 * hashes and tokens among them.
 */
export function loggedError({ type, message, stack }: LoggedError): LoggedError {
  return { type, message, stack };
}
