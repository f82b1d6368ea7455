import { BuiltServer } from './built-server';
import { SERVER_URL } from './server-url';

/** One server for the whole run: seeding takes seconds. What it gives back is called at the end. */
export default async function startServer(): Promise<() => Promise<void>> {
  const server = await BuiltServer.start();
  process.env[SERVER_URL] = server.url;
  return () => server.stop();
}
