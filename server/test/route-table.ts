import {
  METHOD_METADATA,
  PATH_METADATA,
  RESPONSE_PASSTHROUGH_METADATA,
  ROUTE_ARGS_METADATA,
} from '@nestjs/common/constants.js';
import { RequestMethod } from '@nestjs/common';
import { ModulesContainer } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { z } from 'zod';
import { POLICY, type Policy } from '../src/http/allow.decorator.ts';

type Handler = (...values: unknown[]) => unknown;

/** What Nest knows of one route. */
export interface Route {
  readonly method: 'GET' | 'POST' | 'PUT' | 'DELETE';
  readonly path: string;
  /** `POST /api/people/:id` */
  readonly name: string;
  readonly policy: Policy | undefined;
  readonly responseSchema: unknown;
  readonly status: number | undefined;
  /** It writes the answer itself, past the serializer. */
  readonly answersItself: boolean;
  readonly bodySchema: z.ZodType | null;
  readonly querySchema: z.ZodType | null;
}

interface RouteArgument {
  readonly schema?: unknown;
}

const paramTypes = { response: 1, body: 3, query: 4 };
const read = <T>(key: string, target: object): T | undefined =>
  Reflect.getMetadata(key, target) as T | undefined;
const join = (...parts: string[]) =>
  `/${parts
    .flatMap((part) => part.split('/'))
    .filter((part) => part !== '')
    .join('/')}`;

function argumentsOf(controller: object, key: string): Array<[type: number, RouteArgument]> {
  const found = (Reflect.getMetadata(ROUTE_ARGS_METADATA, controller, key) ?? {}) as Record<
    string,
    RouteArgument
  >;
  return Object.entries(found).map(([name, argument]) => [Number(name.split(':')[0]), argument]);
}

const zodOf = (argument: RouteArgument | undefined) =>
  argument?.schema instanceof z.ZodType ? argument.schema : null;

function routeOf(controller: { prototype: object }, key: string, handler: Handler): Route {
  const method = RequestMethod[read<number>(METHOD_METADATA, handler) ?? 0] as Route['method'];
  const path = join(
    read<string>(PATH_METADATA, controller) ?? '',
    read<string>(PATH_METADATA, handler) ?? '',
  );
  const given = argumentsOf(controller, key);
  const of = (wanted: number) => given.find(([type]) => type === wanted)?.[1];
  const passesThrough: unknown = Reflect.getMetadata(
    RESPONSE_PASSTHROUGH_METADATA,
    controller,
    key,
  );
  return {
    method,
    path,
    name: `${method} ${path}`,
    policy: read<Policy>(POLICY, handler),
    responseSchema: read<{ schema?: unknown }>('class_serializer:options', handler)?.schema,
    status: read<number>('__httpCode__', handler),
    answersItself: of(paramTypes.response) !== undefined && passesThrough !== true,
    bodySchema: zodOf(of(paramTypes.body)),
    querySchema: zodOf(of(paramTypes.query)),
  };
}

/** Every route of every controller, read from the running application. */
export function routesOf(app: NestFastifyApplication): Route[] {
  const modules = [...app.get(ModulesContainer).values()];
  const controllers = modules.flatMap((module) => [...module.controllers.values()]);
  return controllers.flatMap(({ metatype }) => {
    const controller = metatype as unknown as { prototype: Record<string, Handler> };
    return Object.getOwnPropertyNames(controller.prototype)
      .filter((key) => key !== 'constructor')
      .map((key) => [key, controller.prototype[key]] as const)
      .flatMap(([key, handler]) =>
        handler && Reflect.hasMetadata(METHOD_METADATA, handler)
          ? [routeOf(controller, key, handler)]
          : [],
      );
  });
}

export const paramsOf = ({ path }: Route): string[] =>
  [...path.matchAll(/:(\w+)/g)].map(([, name]) => name ?? '');

/** The address of a route with its parameters filled in. */
export const fill = ({ path }: Route, valueOf: (name: string) => string): string =>
  path.replaceAll(/:(\w+)/g, (_, name: string) => encodeURIComponent(valueOf(name)));
