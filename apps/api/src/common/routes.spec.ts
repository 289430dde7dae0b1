import { ModulesContainer } from '@nestjs/core';
import { METHOD_METADATA, ROUTE_ARGS_METADATA } from '@nestjs/common/constants';
import { RouteParamtypes } from '@nestjs/common/enums/route-paramtypes.enum';
import type { OpenAPIObject } from '@nestjs/swagger';
import { may, ROLES, type Permission, type Role } from '@lampwright/contracts';
import { getMetadataStorage } from 'class-validator';
import { IS_PUBLIC } from '../auth/public.decorator';
import { PERMISSION } from '../auth/requires-permission.decorator';
import {
  LEAD,
  startTestServer,
  TECHNICIAN,
  TRAINEE,
  type Agent,
  type TestServer,
} from '../testing/test-server';

const ALL = ['technician', 'trainee', 'lead'];
const WORKERS = ['technician', 'lead'];
const LEADS = ['lead'];

/** Who may use which route. A route that is not here fails the test, and so does a row without a route. */
const TABLE: Record<string, 'public' | string[]> = {
  'POST /api/auth/sign-in': 'public',
  'POST /api/auth/refresh': 'public',
  'POST /api/auth/sign-out': 'public',
  'GET /api/health': 'public',
  'GET /api/demo': 'public',
  'GET /api/auth/account': ALL,
  'PATCH /api/auth/account': ALL,
  'POST /api/auth/account/password': ALL,
  'GET /api/auth/account/sessions': ALL,
  'DELETE /api/auth/account/sessions/{id}': ALL,
  'GET /api/people': LEADS,
  'POST /api/people': LEADS,
  'PATCH /api/people/{id}': LEADS,
  'POST /api/people/{id}/close': LEADS,
  'POST /api/people/{id}/reopen': LEADS,
  'GET /api/people/{id}/sessions': LEADS,
  'DELETE /api/people/{id}/sessions/{sessionId}': LEADS,
  'GET /api/trailers': ALL,
  'GET /api/trailers/{id}': ALL,
  'POST /api/trailers': WORKERS,
  'PATCH /api/trailers/{id}': WORKERS,
  'GET /api/plans': ALL,
  'GET /api/plans/{id}': ALL,
  'GET /api/plans/{id}/revisions/{number}': ALL,
  'POST /api/plans': LEADS,
  'POST /api/plans/{id}/revisions': LEADS,
  'GET /api/traces': ALL,
  'GET /api/traces/{id}': ALL,
  'POST /api/traces': WORKERS,
  'POST /api/traces/{id}/events': WORKERS,
};

interface Operation {
  'x-permission'?: Permission;
  'x-public'?: boolean;
  summary?: string;
  responses: Record<string, { content?: Record<string, unknown> }>;
}

let server: TestServer;
let document: OpenAPIObject;
const agents = {} as Record<Role, Agent>;
beforeAll(async () => {
  server = await startTestServer();
  document = (await server.client().get('/api/openapi.json').expect(200)).body;
  agents.lead = await server.signedIn(LEAD);
  agents.technician = await server.signedIn(TECHNICIAN);
  agents.trainee = await server.signedIn(TRAINEE);
});
afterAll(() => server.close());

function operations(): [string, Operation][] {
  return Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(
      ([method, operation]) =>
        [`${method.toUpperCase()} ${path}`, operation as Operation] as [string, Operation],
    ),
  );
}

/** Asks for a route with ids that nobody has and an empty body, so that nothing changes. */
function ask(agent: Agent, route: string) {
  const [method, path] = route.split(' ') as [string, string];
  const address = path.replace(/\{number\}/, '1').replace(/\{\w+\}/g, 'none');
  const verb = method.toLowerCase() as 'get' | 'post' | 'patch' | 'delete';
  return verb === 'get' ? agent.get(address) : agent[verb](address).send({});
}

describe('the table of routes', () => {
  it('has a row for every route, and no other', () => {
    expect(
      operations()
        .map(([route]) => route)
        .sort(),
    ).toEqual(Object.keys(TABLE).sort());
  });

  it('says the same as the permission of each route', () => {
    for (const [route, operation] of operations()) {
      const permission = operation['x-permission'];
      const roles = permission && ROLES.filter((role) => may(role, permission));
      expect({ route, who: operation['x-public'] ? 'public' : roles }).toEqual({
        route,
        who: TABLE[route],
      });
    }
  });

  it.each(Object.entries(TABLE).filter(([, who]) => who !== 'public'))(
    'holds for %s',
    async (route, who) => {
      const anonymous = await ask(server.client(), route).expect(401);
      expect(anonymous.body.reason).toBe('notSignedIn');
      for (const role of ROLES) {
        const { status, body } = await ask(agents[role], route);
        const answer = { role, refused: status === 403 && body.reason === 'notAllowed' };
        expect(answer).toEqual({ role, refused: !who.includes(role) });
        expect(status).toBeLessThan(500);
        expect(status).not.toBe(401);
      }
    },
  );

  it.each(Object.keys(TABLE).filter((route) => !route.startsWith('GET ')))(
    'lets no other site ask for %s',
    async (route) => {
      const { body } = await ask(agents.lead, route)
        .set('Sec-Fetch-Site', 'cross-site')
        .expect(403);
      expect(body.reason).toBe('crossSite');
    },
  );
});

describe('the API document', () => {
  it('tells of every route what it does and how it fails', () => {
    for (const [route, { summary, responses }] of operations()) {
      expect({ route, summary }).toEqual({ route, summary: expect.stringMatching(/\w{4}/) });
      const failures = Object.entries(responses).filter(([status]) => Number(status) >= 400);
      expect({ route, failures: failures.length }).not.toEqual({ route, failures: 0 });
      for (const [, { content }] of failures) {
        expect(Object.keys(content ?? {})).toEqual(['application/problem+json']);
      }
    }
  });

  it('can be read as a page', async () => {
    const { text } = await server.client().get('/api/docs').expect(200);
    expect(text).toContain('swagger-ui');
    await server.client().get('/api/docs/swagger-ui-bundle.js').expect(200);
  });
});

interface Handler {
  name: string;
  handler: object;
  controller: new () => object;
  prototype: object;
}

/** Every method of a controller that answers a route, by Nest's own metadata. */
function handlers(): Handler[] {
  const modules = [...server.app.get(ModulesContainer).values()];
  return modules
    .flatMap((module) => [...module.controllers.values()])
    .flatMap(({ metatype }) => {
      const controller = metatype as new () => object;
      const prototype = controller.prototype as Record<string, object>;
      return Object.getOwnPropertyNames(prototype)
        .map((name) => ({ name, handler: prototype[name]!, controller, prototype }))
        .filter(({ handler }) => Reflect.hasMetadata(METHOD_METADATA, handler));
    });
}

describe('every handler', () => {
  it('is in the table', () => {
    expect(handlers()).toHaveLength(Object.keys(TABLE).length);
  });

  it('is public or names a permission, never both', () => {
    for (const { name, handler } of handlers()) {
      const open = Reflect.hasMetadata(IS_PUBLIC, handler);
      expect({ name, guarded: Reflect.hasMetadata(PERMISSION, handler) }).toEqual({
        name,
        guarded: !open,
      });
    }
  });

  it('takes body, query and path by a class with rules for every field', () => {
    const inputs = [RouteParamtypes.BODY, RouteParamtypes.QUERY, RouteParamtypes.PARAM].map(String);
    let checked = 0;
    for (const { name, controller, prototype } of handlers()) {
      const args = Object.keys(Reflect.getMetadata(ROUTE_ARGS_METADATA, controller, name) ?? {});
      const types = Reflect.getMetadata(
        'design:paramtypes',
        prototype,
        name,
      ) as (new () => object)[];
      for (const [kind, index] of args.map((key) => key.split(':'))) {
        if (!inputs.includes(kind!)) continue;
        const rules = getMetadataStorage().getTargetValidationMetadatas(
          types[Number(index)]!,
          '',
          false,
          false,
        );
        expect({ name, index, rules: rules.length }).not.toEqual({ name, index, rules: 0 });
        checked += 1;
      }
    }
    expect(checked).toBeGreaterThan(20);
  });
});
