import axios, { type AxiosError, isAxiosError } from 'axios';
import { problemOf } from './problem';
import { refreshSession } from './refresh';
import { accessToken, expireSession, signedInAgain } from './session';

declare module 'axios' {
  interface AxiosRequestConfig {
    /** Sent a second time already, so that a refused token is never tried in a circle. */
    repeated?: boolean;
  }
}

export const client = axios.create({ baseURL: '/api', timeout: 30_000 });

client.interceptors.request.use((request) => {
  const token = accessToken();
  if (token !== undefined) request.headers.set('Authorization', `Bearer ${token}`);
  return request;
});

/** A new token by the cookie, or by the person signing in again over the page. */
async function renewToken(): Promise<boolean> {
  try {
    await refreshSession();
    return true;
  } catch (error) {
    if (!isAxiosError(error) || error.response === undefined) throw error;
    expireSession();
    return signedInAgain();
  }
}

client.interceptors.response.use(undefined, async (error: AxiosError) => {
  const request = error.config;
  const lapsed = error.response?.status === 401 && request !== undefined && accessToken() !== undefined;
  if (!lapsed || request.repeated === true) throw axios.isCancel(error) ? error : problemOf(error);
  if (!(await renewToken().catch(() => false))) throw problemOf(error);
  return client({ ...request, repeated: true });
});
