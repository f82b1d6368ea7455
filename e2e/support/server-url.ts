/** The variable by which the tests' processes learn where the server is. */
export const SERVER_URL = 'RESISTRY_E2E_URL';

/** @throws Error outside of a run, where there is no server */
export function serverUrl(): string {
  const url = process.env[SERVER_URL];
  if (url === undefined) throw new Error('The server is started by the global set-up of a test run.');
  return url;
}
