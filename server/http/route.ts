/**
 * A route says what it takes, what it answers and who may use it; everything else follows from that: the checks in
 * front of its handler, the check of what it answers, and its description in OpenAPI.
 */
import { type Request, type RequestHandler, type Response, type Router } from 'express';
import { z } from 'zod';
import { may, siteIdSchema, type Permission, type Role } from '../../model/contracts/common';
import { findSite } from '../../db/queries/sites';
import { needPerson, type Person } from '../auth/person';
import { word } from '../words';
import type { Deps } from './deps';
import { Failure } from './failure';
import { readJson } from './readJson';
import { validateBody } from './validate';

/** `everyone`: signed in or not. `signedIn`: any account. Otherwise what must be allowed on the site in the path. */
export type Access = 'everyone' | 'signedIn' | Permission;
export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

export interface RouteDescription {
  readonly method: Method;
  /** With `:names` of parameters; a route of a site has `:siteId`. */
  readonly path: string;
  readonly summary: string;
  readonly access: Access;
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
  /** What a success carries: JSON by its schema, a file by its media type, or nothing. */
  readonly answer: z.ZodType | 'application/pdf' | 'text/html' | null;
  /** Of a success; 200, or 204 where nothing is answered. */
  readonly status?: 200 | 201;
  /** Statuses of refusals, besides those that follow from the access and the inputs. */
  readonly refusals?: readonly number[];
  /** Refusals that carry more than the usual error. */
  readonly refusalBodies?: Readonly<Record<number, z.ZodType>>;
}

export interface Site {
  readonly id: string;
  readonly name: string;
  readonly role: Role;
  readonly createdAt: Date;
}

type Read<S> = S extends z.ZodType ? z.output<S> : undefined;
type PersonFor<A extends Access> = A extends 'everyone' ? null : Person;
type SiteFor<A extends Access> = A extends Permission ? Site : null;

export interface Asked<P, Q, B, A extends Access> {
  readonly deps: Deps;
  readonly params: P;
  readonly query: Q;
  readonly body: B;
  readonly person: PersonFor<A>;
  /** The site in the path, as the person sees it. */
  readonly site: SiteFor<A>;
  readonly req: Request;
  readonly res: Response;
}

/** An answer with another status than the route's usual one; its body is checked against `refusalBodies`. */
export class OtherAnswer {
  readonly status: number;
  readonly body: unknown;
  constructor(status: number, body: unknown) {
    this.status = status;
    this.body = body;
  }
}

export interface Route extends RouteDescription {
  readonly mount: (router: Router, deps: Deps) => void;
}

interface RouteOptions<P, Q, B, A extends Access, R> extends RouteDescription {
  readonly access: A;
  readonly params?: P & z.ZodObject;
  readonly query?: Q & z.ZodObject;
  readonly body?: B & z.ZodType;
  readonly answer: R & RouteDescription['answer'];
  /** Middleware in front of everything else, such as a limit of tries. */
  readonly before?: (deps: Deps) => RequestHandler;
  /** A file is written to `res` by the handler itself. */
  readonly handle: (
    asked: Asked<Read<P>, Read<Q>, Read<B>, A>,
  ) => Promise<(R extends z.ZodType ? z.input<R> : void) | OtherAnswer>;
}

const BODY_LIMIT = '4mb';
const siteParams = z.object({ siteId: siteIdSchema });

async function needSite(deps: Deps, req: Request, person: Person, permission: Permission): Promise<Site> {
  const params = siteParams.safeParse(req.params);
  const site = params.success ? await findSite(deps.db, params.data.siteId, person.id) : null;
  // A stranger is not told whether there is such a site.
  if (site === null) throw new Failure('notFound', word('server.notFound'));
  if (!may(site.role, permission)) throw new Failure('notAllowed', word('server.notAllowed'));
  return site;
}

function needJson(req: Request): void {
  if (!req.is('application/json')) {
    throw new Failure('badInput', word('server.jsonOnly'), { field: 'content-type', status: 415 });
  }
}

function send(res: Response, route: RouteDescription, answer: unknown): void {
  if (answer instanceof OtherAnswer) {
    const schema = route.refusalBodies?.[answer.status];
    if (schema === undefined) throw new Error(`${route.path} does not describe an answer with status ${answer.status}`);
    res.status(answer.status).json(schema.parse(answer.body));
  } else if (typeof route.answer === 'string') {
    // The sheets and the mail page were written by their handlers.
    return;
  } else if (route.answer === null) {
    res.status(204).end();
  } else {
    res.status(route.status ?? 200).json(route.answer.parse(answer));
  }
}

/** Makes a route from its description and its handler; nothing happens until it is mounted. */
export function route<
  A extends Access,
  R extends RouteDescription['answer'],
  P extends z.ZodObject | undefined = undefined,
  Q extends z.ZodObject | undefined = undefined,
  B extends z.ZodType | undefined = undefined,
>(options: RouteOptions<P, Q, B, A, R>): Route {
  const { before, handle, ...description } = options;
  const parseBody = description.body ? readJson(BODY_LIMIT) : [];

  function mount(router: Router, deps: Deps): void {
    const checkAccess: RequestHandler = async (req, res, next) => {
      const { access } = description;
      const person = access === 'everyone' ? null : await needPerson(deps.auth, req, res);
      const site =
        person === null || access === 'everyone' || access === 'signedIn'
          ? null
          : await needSite(deps, req, person, access);
      res.locals['person'] = person;
      res.locals['site'] = site;
      if (description.body) needJson(req);
      next();
    };
    const answer: RequestHandler = async (req, res) => {
      const params = description.params?.safeParse(req.params);
      // A path that names nothing there could be is a path to nothing.
      if (params && !params.success) throw new Failure('notFound', word('server.notFound'));
      const asked = {
        deps,
        params: params?.data,
        query: description.query && validateBody(description.query, req.query),
        body: description.body && validateBody(description.body, req.body),
        person: res.locals['person'],
        site: res.locals['site'],
        req,
        res,
      } as unknown as Asked<Read<P>, Read<Q>, Read<B>, A>;
      send(res, description, await handle(asked));
    };
    const chain = [...(before ? [before(deps)] : []), checkAccess, ...parseBody, answer];
    router[description.method](description.path, ...chain);
  }
  return { ...description, mount };
}
