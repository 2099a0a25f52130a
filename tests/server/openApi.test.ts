import express from 'express';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { cedarBend } from '../../db/demo/cedarBend';
import { authRoutes } from '../../server/auth/contracts';
import { answerErrors } from '../../server/http/respond';
import { route } from '../../server/http/route';
import { routes } from '../../server/routes';
import { newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

interface Operation {
  readonly summary: string;
  readonly security: readonly unknown[];
  readonly parameters: readonly { readonly name: string; readonly in: string }[];
  readonly requestBody?: { readonly content: Record<string, { readonly schema: object }> };
  readonly responses: Record<string, { readonly content?: Record<string, { readonly schema: object }> }>;
}
interface Document {
  readonly openapi: string;
  readonly paths: Record<string, Record<string, Operation>>;
  readonly components: { readonly schemas: Record<string, object> };
}

let server: TestServer;
let lead: Caller;
let document: Document;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Described');
  document = (await server.stranger().get('/api/openapi.json')).body as Document;
});
afterAll(() => server.close());

/** The schema of an answer made checkable: references resolved by putting the components beside it. */
function schemaOf(path: string, method: string, status: number): z.ZodType {
  const schema = document.paths[path]?.[method]?.responses[status]?.content?.['application/json']?.schema;
  if (schema === undefined) throw new Error(`${method} ${path} does not describe ${status}`);
  const text = JSON.stringify({ ...schema, $defs: document.components.schemas });
  return z.fromJSONSchema(JSON.parse(text.replaceAll('#/components/schemas/', '#/$defs/')));
}

describe('the description of the API', () => {
  it('lists every route there is, with its parameters and its body', () => {
    const described = Object.entries(document.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    const there = [...authRoutes, ...routes].map(({ method, path }) => `${method} ${path.replace(/:(\w+)/g, '{$1}')}`);
    expect(described.sort()).toEqual(there.sort());
    for (const each of [...authRoutes, ...routes]) {
      const operation = document.paths[each.path.replace(/:(\w+)/g, '{$1}')]?.[each.method];
      const inPath = [...each.path.matchAll(/:(\w+)/g)].map((match) => match[1]);
      const named = operation?.parameters.filter((parameter) => parameter.in === 'path').map(({ name }) => name);
      expect(named?.sort(), each.path).toEqual(inPath.sort());
      expect(operation?.requestBody !== undefined, each.path).toBe(each.body !== undefined);
      expect(operation?.security.length === 0, each.path).toBe(each.access === 'everyone');
    }
  });

  it('refers to nothing that it does not hold', () => {
    const references = [...JSON.stringify(document).matchAll(/"\$ref":"([^"]+)"/g)].map((match) => match[1] ?? '');
    expect(references.length).toBeGreaterThan(5);
    for (const reference of references) {
      expect(reference).toMatch(/^#\/components\/schemas\//);
      expect(Object.keys(document.components.schemas)).toContain(reference.split('/').at(-1));
    }
  });

  it('describes what is answered: a draft, a stale save, a revision, a refusal', async () => {
    const { drawing, survey } = cedarBend.draft;
    const siteId = await server.makeSite(lead);
    const path = '/api/sites/{siteId}';
    const save = () =>
      lead.put(`/api/sites/${siteId}/draft/drawing`, { writeId: newWriteId(), baseVersion: 0, drawing });
    const saved = await save();
    const stale = await save();
    const surveyed = await lead.put(`/api/sites/${siteId}/draft/survey`, {
      writeId: newWriteId(),
      baseVersion: 0,
      survey,
    });
    const draft = await lead.get(`/api/sites/${siteId}/draft`);
    const list = await lead.get('/api/sites');
    const missing = await lead.get(`/api/sites/${siteId}/revisions/7`);
    expect([saved, stale, surveyed, draft, list, missing].map(({ status }) => status)).toEqual([
      200, 409, 200, 200, 200, 404,
    ]);
    schemaOf(`${path}/draft/drawing`, 'put', 200).parse(saved.body);
    schemaOf(`${path}/draft/drawing`, 'put', 409).parse(stale.body);
    schemaOf(`${path}/draft`, 'get', 200).parse(draft.body);
    schemaOf('/api/sites', 'get', 200).parse(list.body);
    schemaOf(`${path}/revisions/{number}`, 'get', 404).parse(missing.body);
    expect(schemaOf(`${path}/draft`, 'get', 200).safeParse({ ...draft.body, drawing: null }).success).toBe(false);
  });
});

describe('an answer', () => {
  it('that its own contract refuses is never sent', async () => {
    const wrong = route({
      method: 'get',
      path: '/wrong',
      summary: 'Answers what it does not promise',
      access: 'everyone',
      answer: z.strictObject({ count: z.number() }),
      handle: async () => ({ count: 1, secret: 'kept in' }),
    });
    const app = express();
    app.use((req, _res, next) => {
      req.log = server.deps.log;
      req.id = 'request-1';
      next();
    });
    wrong.mount(app, server.deps);
    app.use(answerErrors());
    const answer = await request(app).get('/wrong');
    expect(answer.status).toBe(500);
    expect(answer.body.error).toMatchObject({ code: 'broken' });
    expect(answer.body.error.message).toContain('request-1');
    expect(answer.text).not.toContain('kept in');
  });
});
