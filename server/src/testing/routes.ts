import { RequestMethod } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants.js';
import { DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core';
import { type Access, accessKey, noFormTokenKey } from '../platform/auth/access.js';
import type { TestApp } from './test-app.js';

export interface Route {
  readonly method: string;
  /** With `:names` where ids stand. */
  readonly path: string;
  /** Who may call it; undefined when the code says nothing. */
  readonly access: Access | undefined;
  readonly webhook: boolean;
}

/** Every route that a controller declares, with what it says about access. */
export function declaredRoutes(app: TestApp): readonly Route[] {
  const reflector = new Reflector();
  const scanner = new MetadataScanner();
  return app.nest
    .get(DiscoveryService, { strict: false })
    .getControllers()
    .flatMap(({ instance, metatype }) => {
      if (!metatype || typeof instance !== 'object' || instance === null) return [];
      const prototype = Object.getPrototypeOf(instance) as Record<string, unknown>;
      return scanner.getAllMethodNames(prototype).flatMap((name) => {
        const handler = prototype[name] as () => unknown;
        const method = Reflect.getMetadata(METHOD_METADATA, handler) as RequestMethod | undefined;
        if (method === undefined) return [];
        return pathsOf(metatype, handler).map((path) => ({
          method: RequestMethod[method],
          path,
          access: reflector.getAllAndOverride<Access | undefined>(accessKey, [handler, metatype]),
          webhook: reflector.get<boolean | undefined>(noFormTokenKey, handler) ?? false,
        }));
      });
    });
}

/** Every route that the router really answers, whoever registered it. */
export function routedPaths(app: TestApp): readonly string[] {
  const { router } = app.nest.getHttpAdapter().getInstance() as { router: { stack: readonly RouterLayer[] } };
  return router.stack.flatMap(({ route }) =>
    route ? Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`) : [],
  );
}

interface RouterLayer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
}

function pathsOf(controller: object, handler: object): readonly string[] {
  const bases = listOf(Reflect.getMetadata(PATH_METADATA, controller));
  const ends = listOf(Reflect.getMetadata(PATH_METADATA, handler));
  return bases.flatMap((base) => ends.map((end) => `/api/${base}/${end}`.replaceAll(/\/+/g, '/').replace(/\/$/, '')));
}

function listOf(value: unknown): readonly string[] {
  return (Array.isArray(value) ? value : [value ?? '']) as readonly string[];
}
