/** The exported client: its files, and its one page for every address that a person may open. */
import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { type RequestHandler, type Router } from 'express';
import { word } from '../words';

/** Metro names these by their content, so that one never changes. */
const HASHED = /[\\/]_expo[\\/]static[\\/]|[\\/]assets[\\/].*\.[0-9a-f]{32}\./;

function serveFiles(folder: string): RequestHandler {
  return express.static(folder, {
    index: false,
    redirect: false,
    setHeaders: (res, file) => {
      const forever = HASHED.test(file);
      res.setHeader('cache-control', forever ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
}

/** Only a person's browser asks for HTML by name; a script or a picture that is missing gets its 404. */
function wantsPage(accept: string | undefined): boolean {
  return accept?.includes('text/html') ?? false;
}

export function serveClient(folder: string): Router {
  const page = path.resolve(folder, 'index.html');
  const router = express.Router();
  router.use(serveFiles(path.resolve(folder)));
  router.get('/{*path}', (req, res, next) => {
    if (!wantsPage(req.get('accept'))) return next();
    if (!existsSync(page)) {
      res.status(404).type('text').send(word('server.noClient'));
      return;
    }
    res.setHeader('cache-control', 'no-cache');
    res.sendFile(page);
  });
  return router;
}
