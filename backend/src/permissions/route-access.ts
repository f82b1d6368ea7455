import type { Reflector } from '@nestjs/core';
import { ACCESS, type Access } from './may.decorator';
import { PUBLIC } from './public.decorator';

export type RouteAccess = { kind: 'public' } | { kind: 'closed' } | ({ kind: 'ruled' } & Access);

type Handler = Parameters<Reflector['get']>[1];

/** How a route is guarded, read from its decorators. One with none, or with both, is closed. */
export function routeAccessOf(reflector: Reflector, handler: Handler): RouteAccess {
  const isPublic = reflector.get<boolean | undefined>(PUBLIC, handler) ?? false;
  const access = reflector.get<Access | undefined>(ACCESS, handler);
  if (isPublic && !access) return { kind: 'public' };
  if (access && !isPublic) return { kind: 'ruled', ...access };
  return { kind: 'closed' };
}
