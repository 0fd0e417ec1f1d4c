import { join } from 'node:path';
import express, { type RequestHandler, type Router } from 'express';
import { notFound } from './http-problem.js';

/** The built page: hashed assets for ever, the page itself always fresh; every other address is the page's own. */
export function servePage(webFolder: string, headers: RequestHandler): Router {
  const router = express.Router();
  router.use(headers);
  router.use('/assets', express.static(join(webFolder, 'assets'), { immutable: true, maxAge: '365d', index: false, fallthrough: false }));
  router.use(express.static(webFolder, { index: false, maxAge: '1h' }));
  router.get('/{*path}', (_request, response, next) => {
    response.set('Cache-Control', 'no-cache').sendFile(join(webFolder, 'index.html'), (fault) => {
      if (fault) next(notFound('The page has not been built.'));
    });
  });
  return router;
}
