import type { INestApplication, Type } from '@nestjs/common';
import { GUARDS_METADATA, METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants';
import { RequestMethod } from '@nestjs/common';
import { ModulesContainer, Reflector } from '@nestjs/core';
import { ACCESS, type Access } from '../../src/auth/access.decorators';

export interface Route {
  method: string;
  /** As declared, with `:parameters`. */
  path: string;
  access: Access | null;
  /** Names of the guards that stand before this route alone. */
  guards: string[];
}

/** Every route of the running application, read from its controllers. */
export function routesOf(app: INestApplication): Route[] {
  const reflector = app.get(Reflector);
  const controllers = [...app.get(ModulesContainer).values()].flatMap((module) => [
    ...module.controllers.values(),
  ]);
  return controllers
    .flatMap(({ metatype }) => (metatype ? handlersOf(metatype as Type, reflector) : []))
    .sort((a, b) => `${a.path} ${a.method}`.localeCompare(`${b.path} ${b.method}`));
}

function handlersOf(controller: Type, reflector: Reflector): Route[] {
  const prototype = controller.prototype as Record<string, () => unknown>;
  const base = Reflect.getMetadata(PATH_METADATA, controller) as string;
  return Object.getOwnPropertyNames(prototype).flatMap((name) => {
    if (name === 'constructor') return [];
    const handler = prototype[name];
    const path = handler && (Reflect.getMetadata(PATH_METADATA, handler) as string | undefined);
    if (!handler || path === undefined) return [];
    const guards = [controller, handler].flatMap(
      (one) => (Reflect.getMetadata(GUARDS_METADATA, one) ?? []) as { name: string }[],
    );
    return [
      {
        method: RequestMethod[Reflect.getMetadata(METHOD_METADATA, handler) as number] ?? 'ALL',
        path: `/api/${base}/${path}`.replaceAll(/\/+/g, '/').replace(/(.)\/$/, '$1'),
        access: reflector.getAllAndOverride<Access | undefined>(ACCESS, [handler, controller]) ?? null,
        guards: guards.map((guard) => guard.name),
      },
    ];
  });
}
