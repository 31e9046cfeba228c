import { readFile } from 'node:fs/promises';
import type { Server } from 'node:http';
import { Router, type RequestHandler } from 'express';

/** Vite in middleware mode: one port, hot reload over the same server. Development only. */
export async function serveWithVite(server: Server): Promise<RequestHandler> {
  const { createServer } = await import('vite');
  const vite = await createServer({
    appType: 'custom',
    server: { middlewareMode: true, hmr: { server } },
  });
  const router = Router();
  router.use(vite.middlewares);
  router.get('/{*address}', async (request, response) => {
    const page = await readFile('index.html', 'utf8');
    response.type('html').send(await vite.transformIndexHtml(request.originalUrl, page));
  });
  return router;
}
