import axios from 'axios';
import { type Session, startSession } from './session';

let inFlight: Promise<Session> | undefined;

/**
 * Trades the refresh cookie for a new access token. Requests that expire together share one exchange, because the
 * cookie rotates: a second exchange with the old one would count as theft and end the sign-in everywhere.
 * @throws AxiosError with status 401 where there is no valid cookie
 */
export function refreshSession(): Promise<Session> {
  inFlight ??= axios
    .post<Session>('/api/auth/refresh', {})
    .then((response) => {
      startSession(response.data);
      return response.data;
    })
    .finally(() => {
      inFlight = undefined;
    });
  return inFlight;
}
