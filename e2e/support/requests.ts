import { type APIResponse, expect } from '@playwright/test';
import type { Desk } from './test';

/** A request past the pages, by whoever sits at the desk. */
export function ask(
  { context, accessToken }: Desk,
  method: 'GET' | 'POST',
  path: string,
  data?: object,
): Promise<APIResponse> {
  return context.request.fetch(path, { method, data, headers: { authorization: `Bearer ${accessToken}` } });
}

async function read<Answer>(
  desk: Desk,
  method: 'GET' | 'POST',
  path: string,
  data?: object,
): Promise<Answer> {
  const answer = await ask(desk, method, path, data);
  expect(answer.status(), await answer.text()).toBe(200);
  return (await answer.json()) as Answer;
}

export interface Part {
  id: number;
  manufacturerPartNumber: string;
  approval: string;
  supply: string;
  version: number;
}

export const readPart = (desk: Desk, id: number): Promise<Part> => read(desk, 'GET', `/api/parts/${id}`);

export interface Transition {
  to: string;
  allowed: boolean;
  demands: { met: boolean }[];
  forbiddenBy?: { rule: string };
}

/** What may become of a part's approval, as the one who asks may change it. */
export async function approvalTransition(
  desk: Desk,
  id: number,
  to: string,
): Promise<Transition | undefined> {
  const { approvalTransitions } = await read<{ approvalTransitions: Transition[] }>(
    desk,
    'GET',
    `/api/parts/${id}/transitions`,
  );
  return approvalTransitions.find((transition) => transition.to === to);
}

/** The parts that a search finds, the first fifty. */
export async function searchParts(desk: Desk, request: object): Promise<Part[]> {
  const { items } = await read<{ items: { part: Part }[] }>(desk, 'POST', '/api/parts/search', request);
  return items.map(({ part }) => part);
}

/** The first of the parts that fits. @throws Error when none does */
export async function firstThat(parts: Part[], fits: (part: Part) => Promise<boolean>): Promise<Part> {
  for (const part of parts) if (await fits(part)) return part;
  throw new Error('The demonstration has no such part.');
}
