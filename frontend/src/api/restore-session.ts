import { isAxiosError } from 'axios';
import { refreshSession } from './refresh';
import { endSession } from './session';

const pauseMilliseconds = 2000;

/**
 * On load: the refresh cookie, if there is one, brings the sign-in back. A server that does not answer says nothing
 * about the sign-in, so it is asked again rather than the person sent away.
 */
export async function restoreSession(): Promise<void> {
  try {
    await refreshSession();
  } catch (error) {
    if (isAxiosError(error) && (error.response === undefined || error.response.status >= 500)) {
      setTimeout(() => void restoreSession(), pauseMilliseconds);
      return;
    }
    endSession();
  }
}
