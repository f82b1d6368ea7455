import type { SignedInPerson } from './people-builder';

export interface Letter {
  id: string;
  from: string;
  to: string;
  subject: string;
  date: string;
  text: string;
  links: string[];
}

/** The letters to one address that the local catcher keeps, newest first, read through the API. */
export async function lettersTo(administrator: SignedInPerson, address: string): Promise<Letter[]> {
  const list = await administrator.get('/api/mail?limit=100').expect(200);
  const { items } = list.body as { items: Letter[] };
  const ids = items.filter(({ to }) => to === address).map(({ id }) => id);
  return Promise.all(
    ids.map(async (id) => (await administrator.get(`/api/mail/${id}`).expect(200)).body as Letter),
  );
}

/** The token in the link of a letter. */
export function tokenIn(letter: Letter | undefined): string {
  return letter?.links[0]?.split('#token=')[1] ?? '';
}
