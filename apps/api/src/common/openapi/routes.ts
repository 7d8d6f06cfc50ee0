import { RequestMethod, type Type } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA, ROUTE_ARGS_METADATA } from '@nestjs/common/constants';
import { RouteParamtypes } from '@nestjs/common/enums/route-paramtypes.enum';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';
import type { z } from 'zod';

import { ACCESS, type AccessRule } from '../access/access.js';
import { IDEMPOTENT } from '../idempotency/idempotency.interceptor.js';
import { ANSWERS, type AnswersMetadata } from '../validation/answers.js';
import { ZodPipe } from '../validation/zod.pipe.js';

/** One route as its decorators describe it. */
export interface RouteDescription {
  method: string;
  /** With `:parameters`, global prefix included. */
  path: string;
  /** `MeasureUpsController.create` */
  handler: string;
  access: AccessRule | null;
  idempotent: boolean;
  answers: AnswersMetadata | null;
  body: z.ZodType | null;
  query: z.ZodType | null;
  params: Record<string, z.ZodType>;
}

interface Argument {
  data?: unknown;
  pipes?: unknown[];
}

const outsidePrefix = /^(health|metrics)(\/|$)/;

const pathOf = (controller: string, method: string): string => {
  const joined = [controller, method]
    .map((part) => part.replace(/^\/+|\/+$/g, ''))
    .filter(Boolean)
    .join('/');
  return outsidePrefix.test(joined) ? `/${joined}` : `/api/${joined}`;
};

/** Every route of the application, sorted; the OpenAPI document and the access test are made from it. */
export function describeRoutes(discovery: DiscoveryService, scanner: MetadataScanner): RouteDescription[] {
  const routes = discovery.getControllers().flatMap(({ metatype, instance }) => {
    if (typeof metatype !== 'function' || typeof instance !== 'object' || instance === null) return [];
    const prototype = Object.getPrototypeOf(instance) as Record<string, unknown>;
    return scanner
      .getAllMethodNames(prototype)
      .filter((name) => Reflect.hasMetadata(METHOD_METADATA, prototype[name] as object))
      .map((name) => describeRoute(metatype as Type, prototype[name] as object, name));
  });
  return routes.sort((a, b) => `${a.path} ${a.method}`.localeCompare(`${b.path} ${b.method}`));
}

function describeRoute(controller: Type, handler: object, name: string): RouteDescription {
  const meta = <T>(key: string): T | undefined =>
    (Reflect.getMetadata(key, handler) ?? Reflect.getMetadata(key, controller)) as T | undefined;
  const route: RouteDescription = {
    method: RequestMethod[Reflect.getMetadata(METHOD_METADATA, handler) as RequestMethod],
    path: pathOf(
      Reflect.getMetadata(PATH_METADATA, controller) as string,
      Reflect.getMetadata(PATH_METADATA, handler) as string,
    ),
    handler: `${controller.name}.${name}`,
    access: meta<AccessRule>(ACCESS) ?? null,
    idempotent: meta<string>(IDEMPOTENT) !== undefined,
    answers: meta<AnswersMetadata>(ANSWERS) ?? null,
    body: null,
    query: null,
    params: {},
  };
  const args = (Reflect.getMetadata(ROUTE_ARGS_METADATA, controller, name) ?? {}) as Record<string, Argument>;
  for (const [key, { data, pipes = [] }] of Object.entries(args)) {
    const pipe = pipes.find((candidate) => candidate instanceof ZodPipe);
    if (!pipe) continue;
    const type = Number(key.split(':')[0]) as RouteParamtypes;
    if (type === RouteParamtypes.BODY) route.body = pipe.schema;
    else if (type === RouteParamtypes.QUERY) route.query = pipe.schema;
    else if (type === RouteParamtypes.PARAM && typeof data === 'string') route.params[data] = pipe.schema;
  }
  return route;
}
