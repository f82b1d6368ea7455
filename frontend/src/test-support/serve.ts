import axios, {
  type AxiosAdapter,
  AxiosError,
  type AxiosResponse,
  type InternalAxiosRequestConfig,
} from 'axios';
import { client } from '../api/client';

export interface Answer {
  status: number;
  data: unknown;
}

/** Stands for the server: one function that sees each request and answers it. */
export function serve(answer: (request: InternalAxiosRequestConfig) => Answer): void {
  const adapter: AxiosAdapter = (request) => {
    const { status, data } = answer(request);
    const response: AxiosResponse = { status, data, statusText: '', headers: {}, config: request };
    if (status < 400) return Promise.resolve(response);
    return Promise.reject(new AxiosError(String(status), undefined, request, undefined, response));
  };
  client.defaults.adapter = adapter;
  axios.defaults.adapter = adapter;
}
