import { join } from 'node:path';
import express, { type Express } from 'express';

/**
 * Serves the built client. Names under assets/ carry a hash of their content and never change;
 * every page of the client is the one index.html, which is asked for anew each time.
 */
export function serveClient(app: Express, folder: string): void {
  app.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false }),
  );
  app.use('/assets', (_request, response) => {
    response.status(404).type('text/plain').send('Not found');
  });
  app.use(express.static(folder, { maxAge: '1h', index: false }));
  app.get('/{*path}', (_request, response) => {
    response.set('Cache-Control', 'no-cache').sendFile('index.html', { root: folder });
  });
}
