/** The API described by OpenAPI 3.1, from the same schemas that check it. */
import { z } from 'zod';
import { errorSchema, PERMISSIONS, siteIdSchema } from '../../model/contracts/common';
import { draftSchema, revisionSummarySchema, staleSchema } from '../../model/contracts/drawings';
import { drawingSchema } from '../../model/drawing/schema';
import { surveySchema } from '../../model/drawing/surveySchema';
import type { RouteDescription } from './route';

type Json = Record<string, unknown>;

/** Schemas that stand once under their name and are referred to. */
const named = z.registry<{ id: string }>();
named.add(drawingSchema, { id: 'Drawing' });
named.add(surveySchema, { id: 'Survey' });
named.add(draftSchema, { id: 'Draft' });
named.add(revisionSummarySchema, { id: 'RevisionSummary' });
named.add(staleSchema, { id: 'Stale' });
named.add(errorSchema, { id: 'Error' });

/** Collects the named schemas that the described ones refer to. */
class Components {
  readonly schemas: Json = {};

  /** `io`: what a caller may send, or what the server sends. */
  describe(schema: z.ZodType, io: 'input' | 'output'): Json {
    const whole = z.toJSONSchema(z.object({ it: schema }), { metadata: named, io, unrepresentable: 'any' });
    const { $defs = {}, properties } = this.#referring(whole) as { $defs?: Json; properties: { it: Json } };
    Object.assign(this.schemas, $defs);
    return properties.it;
  }

  /** The same schema with its references pointing into the document's components. */
  #referring(schema: unknown): unknown {
    if (Array.isArray(schema)) return schema.map((item) => this.#referring(item));
    if (typeof schema !== 'object' || schema === null) return schema;
    const entries = Object.entries(schema).filter(
      ([key]) => key !== 'id' || typeof Reflect.get(schema, 'id') !== 'string',
    );
    return Object.fromEntries(
      entries.map(([key, value]) => {
        if (key === '$ref' && typeof value === 'string')
          return [key, value.replace('#/$defs/', '#/components/schemas/')];
        return [key, this.#referring(value)];
      }),
    );
  }
}

/** `/api/sites/:siteId` as OpenAPI writes it, `/api/sites/{siteId}`. */
export function openApiPath(path: string): string {
  return path.replace(/:([A-Za-z]+)/g, '{$1}');
}

function describeParameters(route: RouteDescription, components: Components): Json[] {
  const shapes: [string, z.ZodObject | undefined][] = [
    ['path', route.path.includes(':siteId') ? z.object({ siteId: siteIdSchema }) : undefined],
    ['path', route.params],
    ['query', route.query],
  ];
  return shapes.flatMap(([place, object]) =>
    Object.entries(object?.shape ?? {}).map(([name, schema]) => ({
      name,
      in: place,
      required: place === 'path' || !schema.safeParse(undefined).success,
      schema: components.describe(schema as z.ZodType, 'input'),
    })),
  );
}

/** Statuses that a refusal of this route can have. */
function refusalsOf(route: RouteDescription): number[] {
  const { access, method, body, params, refusals = [], refusalBodies = {} } = route;
  const statuses = new Set<number>([...refusals, ...Object.keys(refusalBodies).map(Number), 500]);
  if (access !== 'everyone') statuses.add(401);
  if (access !== 'everyone' && access !== 'signedIn') statuses.add(404);
  if (access in PERMISSIONS && access !== 'read') statuses.add(403);
  if (method !== 'get') statuses.add(403);
  if (params) statuses.add(404);
  if (body) [400, 413, 415].forEach((status) => statuses.add(status));
  return [...statuses].sort((a, b) => a - b);
}

function describeAnswer(route: RouteDescription, components: Components): Json {
  const { answer } = route;
  if (answer === null) return { 204: { description: 'Done' } };
  const content =
    typeof answer === 'string'
      ? { [answer]: { schema: { type: 'string' } } }
      : { 'application/json': { schema: components.describe(answer, 'output') } };
  return { [route.status ?? 200]: { description: 'Done', content } };
}

function describeRefusals(route: RouteDescription, components: Components): Json {
  return Object.fromEntries(
    refusalsOf(route).map((status) => {
      const schema = route.refusalBodies?.[status] ?? errorSchema;
      const content = { 'application/json': { schema: components.describe(schema, 'output') } };
      return [status, { description: 'Refused', content }];
    }),
  );
}

function whoMay({ access }: RouteDescription): string {
  if (access === 'everyone') return 'Open to everyone.';
  if (access === 'signedIn') return 'For anyone signed in.';
  return `For the roles ${PERMISSIONS[access].join(', ')} on the site.`;
}

/** The whole document for these routes. */
export function describeApi(routes: readonly RouteDescription[], appUrl: string): Json {
  const components = new Components();
  const paths: Record<string, Json> = {};
  for (const route of routes) {
    const path = openApiPath(route.path);
    paths[path] ??= {};
    paths[path][route.method] = {
      summary: route.summary,
      description: whoMay(route),
      security: route.access === 'everyone' ? [] : [{ session: [] }],
      parameters: describeParameters(route, components),
      ...(route.body
        ? {
            requestBody: {
              required: true,
              content: { 'application/json': { schema: components.describe(route.body, 'input') } },
            },
          }
        : {}),
      responses: { ...describeAnswer(route, components), ...describeRefusals(route, components) },
    };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Polewright', version: '1' },
    servers: [{ url: appUrl }],
    paths,
    components: {
      schemas: components.schemas,
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'polewright.session_token' } },
    },
  };
}
