import type { INestApplication } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants';
import { DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core';
import { RequestMethod } from '@nestjs/common';
import { type RouteAccess, routeAccessOf } from '../../src/permissions/route-access';

export interface Route {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** With `:parameters`, beginning with /api */
  path: string;
  access: RouteAccess;
}

type Handler = Parameters<typeof routeAccessOf>[1];

const METHODS: Partial<Record<RequestMethod, Route['method']>> = {
  [RequestMethod.GET]: 'get',
  [RequestMethod.POST]: 'post',
  [RequestMethod.PUT]: 'put',
  [RequestMethod.PATCH]: 'patch',
  [RequestMethod.DELETE]: 'delete',
};

/** Every route that a controller of the application declares, with what guards it. */
export function routesOf(application: INestApplication): Route[] {
  const reflector = application.get(Reflector);
  const scanner = new MetadataScanner();
  return controllersOf(application).flatMap(({ instance, prefix }) => {
    const prototype = Object.getPrototypeOf(instance) as Record<string, Handler>;
    return scanner.getAllMethodNames(prototype).flatMap((name): Route[] => {
      const handler = prototype[name];
      const path = handler && reflector.get<string | undefined>(PATH_METADATA, handler);
      const method = handler && METHODS[reflector.get<RequestMethod>(METHOD_METADATA, handler)];
      if (!handler || path === undefined || !method) return [];
      return [{ method, path: joined('api', prefix, path), access: routeAccessOf(reflector, handler) }];
    });
  });
}

function controllersOf(application: INestApplication): { instance: object; prefix: string }[] {
  const reflector = application.get(Reflector);
  return application
    .get(DiscoveryService, { strict: false })
    .getControllers()
    .map(({ instance }) => instance as object)
    .map((instance) => ({ instance, prefix: reflector.get<string>(PATH_METADATA, instance.constructor) }));
}

function joined(...parts: string[]): string {
  return `/${parts
    .flatMap((part) => part.split('/'))
    .filter(Boolean)
    .join('/')}`;
}
