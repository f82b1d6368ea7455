import type { InternalAxiosRequestConfig } from 'axios';
import { serve } from '../test-support/serve';
import { sessionOf } from '../test-support/session-of';
import { client } from './client';
import { Problem } from './problem';
import { endSession, sessionState, startSession } from './session';

const session = (accessToken: string) => sessionOf(['designer'], [], accessToken);

const token = (request: InternalAxiosRequestConfig): string => String(request.headers.get('Authorization'));

afterEach(() => endSession());

describe('the client', () => {
  it('sends the token of the session', async () => {
    startSession(session('first'));
    serve((request) => ({ status: 200, data: token(request) }));
    expect((await client.get<string>('/parts/1')).data).toBe('Bearer first');
  });

  it('renews the token once for requests that expire together, and sends them again', async () => {
    startSession(session('old'));
    let refreshes = 0;
    serve((request) => {
      if (request.url === '/api/auth/refresh') {
        refreshes += 1;
        return { status: 200, data: session('new') };
      }
      return token(request) === 'Bearer new' ? { status: 200, data: 'fine' } : { status: 401, data: {} };
    });
    const answers = await Promise.all([client.get('/a'), client.get('/b'), client.get('/c')]);
    expect(answers.map((answer): unknown => answer.data)).toEqual(['fine', 'fine', 'fine']);
    expect(refreshes).toBe(1);
  });

  it('waits for the person to sign in again when the cookie has lapsed too, and loses nothing', async () => {
    startSession(session('old'));
    serve((request) =>
      token(request) === 'Bearer again'
        ? { status: 200, data: request.data as unknown }
        : { status: 401, data: {} },
    );
    const pending = client.post('/parts/1/approval', { reason: 'entered with care' });
    await new Promise((resolve) => setTimeout(resolve));
    expect(sessionState().status).toBe('expired');
    startSession(session('again'));
    expect((await pending).data).toEqual({ reason: 'entered with care' });
  });

  it('gives up after one repetition', async () => {
    startSession(session('old'));
    serve((request) =>
      request.url === '/api/auth/refresh' ? { status: 200, data: session('new') } : { status: 401, data: {} },
    );
    await expect(client.get('/a')).rejects.toMatchObject({ status: 401 });
  });

  it('turns a problem document into a Problem with its fields, rule and request id', async () => {
    serve(() => ({
      status: 422,
      data: {
        type: 'urn:resistry:problem:duty-clash',
        title: 'The duty contradicts itself',
        detail: 'lower lies above upper',
        instance: 'req-7',
        errors: [{ pointer: '/duty/window/lower', message: 'lies above the highest value' }],
      },
    }));
    const problem = await client.post('/requirements', {}).catch((error: unknown) => error);
    expect(problem).toBeInstanceOf(Problem);
    expect(problem).toMatchObject({ kind: 'duty-clash', status: 422, requestId: 'req-7' });
    expect((problem as Problem).at('/duty/window/lower')).toBe('lies above the highest value');
  });
});
