/** A signed-in person of the demonstration. */
export interface Client {
  search(body: unknown): Promise<{ answer: SearchAnswer; milliseconds: number }>;
  get(path: string): Promise<{ status: number; milliseconds: number }>;
}

export interface SearchAnswer {
  total: number;
  unrated: number;
  items: { part: { id: number } }[];
  knockouts: { check: string; removes: number; removesAlone: number }[];
}

/** Signs in and gives a client; throws where the server refuses. */
export async function signIn(url: string, account = 'designer'): Promise<Client & { milliseconds: number }> {
  const started = performance.now();
  const response = await fetch(`${url}/api/auth/sign-in`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: url },
    body: JSON.stringify({ email: `${account}@brackwater.example.com`, password: 'brackwater-demo' }),
  });
  if (!response.ok) throw new Error(`Sign-in answered ${String(response.status)}: ${await response.text()}`);
  const { accessToken } = (await response.json()) as { accessToken: string };
  const milliseconds = performance.now() - started;
  const headers = { 'content-type': 'application/json', authorization: `Bearer ${accessToken}` };
  return {
    milliseconds,
    async search(body) {
      const begun = performance.now();
      const answer = await fetch(`${url}/api/parts/search`, {
        method: 'POST',
        headers,
        body: JSON.stringify(body),
      });
      const text = await answer.text();
      const taken = performance.now() - begun;
      if (!answer.ok) throw new Error(`The search answered ${String(answer.status)}: ${text}`);
      return { answer: JSON.parse(text) as SearchAnswer, milliseconds: taken };
    },
    async get(path) {
      const begun = performance.now();
      const answer = await fetch(`${url}${path}`, { headers });
      await answer.text();
      return { status: answer.status, milliseconds: performance.now() - begun };
    },
  };
}
