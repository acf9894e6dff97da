import { join } from 'node:path';
import express, { Router } from 'express';

/** The built client; every path that is no file is a page of it. */
export function serveClient(folder: string): Router {
  const router = Router();
  const year = 365 * 24 * 3600;
  router.use(
    '/assets',
    // Their names hold a hash of what is in them.
    express.static(join(folder, 'assets'), { immutable: true, maxAge: year * 1000 }),
    (_req, res) => {
      res.status(404).type('text/plain').send('Not found');
    },
  );
  router.use(express.static(folder, { index: false, dotfiles: 'ignore' }));
  router.get('/{*page}', (_req, res) => {
    res.sendFile('index.html', { root: folder, cacheControl: false }, (error) => {
      if (error && !res.headersSent) {
        res.status(503).type('text/plain').send('The client is not built.');
      }
    });
    res.set('Cache-Control', 'no-cache');
  });
  return router;
}
