import express, { Router } from 'express';

/** The built client: hashed assets for a year, every other address gets the page, which routes by itself. */
export function servePages(root: string): Router {
  const router = Router();
  router.use(
    '/assets',
    express.static(`${root}/assets`, { immutable: true, maxAge: '365d', index: false, etag: false }),
  );
  router.use('/assets', (_request, response) => {
    response.status(404).end();
  });
  router.use(express.static(root, { index: false, maxAge: 0 }));
  router.get('/{*path}', (_request, response, next) => {
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile('index.html', { root }, (error?: Error) => {
      if (error !== undefined) next(error);
    });
  });
  return router;
}
