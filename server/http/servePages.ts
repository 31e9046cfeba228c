import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { Router, type RequestHandler } from 'express';

/**
 * The built client: hashed assets for a year, the page for every other address (the client
 * routes them). What is missing below `/assets` is missing, not the page.
 */
export function servePages(folder: string): RequestHandler {
  const page = path.join(folder, 'index.html');
  if (!existsSync(page)) throw new Error(`The client is not built: ${page} is missing.`);
  const router = Router();
  router.use(
    '/assets',
    express.static(path.join(folder, 'assets'), {
      immutable: true,
      maxAge: '1y',
      fallthrough: false,
    }),
  );
  router.use(express.static(folder, { index: false, dotfiles: 'ignore', maxAge: '1h' }));
  router.get('/{*address}', (request, response, next) => {
    // A file that does not exist is not a page: no /.env, no /package.json, no source maps.
    if (/\.[A-Za-z0-9]+$|\/\./.test(request.path)) return next();
    response.set('Cache-Control', 'no-cache').sendFile(page, { dotfiles: 'allow' });
  });
  return router;
}
