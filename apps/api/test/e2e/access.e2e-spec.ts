import { randomUUID } from 'node:crypto';

import type { NestInterceptor } from '@nestjs/common';
import { DiscoveryService, MetadataScanner } from '@nestjs/core';

import { describeRoutes, type RouteDescription } from '../../src/common/openapi/routes.js';
import { ProblemException } from '../../src/common/problems/problem.exception.js';
import { createAccessWorld, type AccessWorld } from '../support/access-world.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { testPassword } from '../factories/account.factory.js';
import { accessTable, roles, type Access, type Role } from './access-table.js';

describe('access', () => {
  let app: TestApp;
  let world: AccessWorld;
  let routes: Map<string, RouteDescription>;
  let handlersRun = true;

  beforeAll(async () => {
    app = await startTestApp(
      {},
      {
        prepare: (nest) =>
          nest.useGlobalInterceptors({
            intercept: (_context, next) => {
              // Stands where the handler would run: whoever gets here was let in, and nothing happens.
              if (!handlersRun) throw new ProblemException('let-in', 418, 'Let in');
              return next.handle();
            },
          } satisfies NestInterceptor),
      },
    );
    const described = describeRoutes(app.nest.get(DiscoveryService), app.nest.get(MetadataScanner));
    routes = new Map(described.map((route) => [`${route.method} ${route.path}`, route]));
    world = await createAccessWorld(app);
    handlersRun = false;
  });
  afterAll(() => app.close());

  it('is written down for every route there is, and for no other', () => {
    expect(Object.keys(accessTable).sort()).toEqual([...routes.keys()].sort());
  });

  it('is walked over everything the router knows', () => {
    const express = app.nest.getHttpAdapter().getInstance() as {
      router: { stack: { route?: { path: string; methods: Record<string, boolean> } }[] };
    };
    // Nest hangs its middleware on every method there is; a handler has one.
    const known = express.router.stack.flatMap(({ route }) => {
      const [method, ...others] = Object.keys(route?.methods ?? {});
      return route && method && others.length === 0 ? [`${method.toUpperCase()} ${route.path}`] : [];
    });
    expect(known.sort()).toEqual([...routes.keys()].sort());
  });

  it('is documented: every route is in the OpenAPI document with its rule', async () => {
    handlersRun = true;
    const { body } = await app.client().get('/api/openapi.json').expect(200);
    handlersRun = false;
    const paths = body.paths as Record<string, Record<string, { 'x-access': unknown }>>;
    const documented = Object.entries(paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`),
    );
    expect(documented.sort()).toEqual([...routes.keys()].sort());
    expect(body.openapi).toBe('3.1.0');
    const rules = Object.values(paths).flatMap((operations) => Object.values(operations));
    expect(rules.every((operation) => operation['x-access'] !== null)).toBe(true);
  });

  it.each(Object.keys(accessTable))('of %s', async (name) => {
    const route = routes.get(name);
    if (!route) throw new Error('there is no such route');
    const found: Partial<Record<Role, Access>> = {};
    for (const role of roles) found[role] = await tryRoute(world, route, role);
    expect(found).toEqual(accessTable[name]);
  });

  async function tryRoute(
    { browsers, address }: AccessWorld,
    route: RouteDescription,
    role: Role,
  ): Promise<Access> {
    const method = route.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    const request = browsers[role][method](address(route.path, route.access));
    // The sign-in route has a guard of its own that wants a well-formed body.
    const body = { email: `${randomUUID()}@example.test`, password: testPassword };
    const answer = await (method === 'get' ? request : request.send(body));
    if (answer.body.code === 'let-in' || answer.body.code === 'wrong-credentials') return 'in';
    if (answer.status === 401 || answer.status === 403 || answer.status === 404) return answer.status;
    throw new Error(`${role} got ${answer.status} ${answer.text}`);
  }
});
