/** The whole server as one Express app, listening to nothing: `index.ts` and the tests do that. */
import { randomUUID } from 'node:crypto';
import compression from 'compression';
import express, { type Express } from 'express';
import { pinoHttp } from 'pino-http';
import { authRoutes } from './auth/contracts';
import { handleAuth } from './auth/handler';
import { serveClient } from './http/client';
import type { Deps } from './http/deps';
import { limitTries } from './http/limits';
import { describeApi } from './http/openApi';
import { refuseOtherOrigins } from './http/origin';
import { protect } from './http/protect';
import { readJson } from './http/readJson';
import { answerErrors, answerNoSuchPath } from './http/respond';
import { routes } from './routes';

/** Tries at accounts and passwords from one address. */
const AUTH_TRIES = { most: 60, minutes: 10 };
const AUTH_BODY_LIMIT = '16kb';

function mountAuth(app: Express, deps: Deps): void {
  const limit = limitTries(deps.env, AUTH_TRIES);
  app.use('/api/auth', (req, res, next) => (req.method === 'GET' ? next() : limit(req, res, next)));
  // Read here, so that a body that is too long or not JSON is refused in our own words; better-auth takes it as read.
  app.all('/api/auth/{*any}', readJson(AUTH_BODY_LIMIT), handleAuth(deps.auth));
}

function mountApi(app: Express, deps: Deps): void {
  const description = describeApi([...authRoutes, ...routes], deps.env.APP_URL);
  const api = express.Router();
  for (const route of routes) route.mount(api, deps);
  app.use(api);
  app.get('/api/openapi.json', (_req, res) => {
    res.json(description);
  });
  app.use('/api', answerNoSuchPath());
}

export function buildApp(deps: Deps): Express {
  const app = express();
  app.set('trust proxy', deps.env.TRUST_PROXY);
  app.set('etag', 'strong');
  app.disable('x-powered-by');
  app.use(
    pinoHttp({
      logger: deps.log,
      genReqId: (_req, res) => {
        const id = randomUUID();
        res.setHeader('x-request-id', id);
        return id;
      },
      // Tokens stand in some paths, and cookies in every header: neither belongs in a log.
      serializers: {
        req: ({ id, method, url }) => ({ id, method, url: withoutToken(url) }),
        res: ({ statusCode }) => ({ statusCode }),
      },
    }),
  );
  app.use(protect(deps.env));
  app.use(compression());
  app.use('/api', (_req, res, next) => {
    res.setHeader('cache-control', 'no-store');
    next();
  });
  app.use('/api', refuseOtherOrigins(deps.env));
  mountAuth(app, deps);
  mountApi(app, deps);
  app.use(serveClient(deps.env.CLIENT_DIR));
  app.use(answerErrors());
  return app;
}

function withoutToken(url: string): string {
  return url.replace(/(\/api\/invitations\/)[^/?]+/, '$1…').replace(/([?&]token=)[^&]+/, '$1…');
}
