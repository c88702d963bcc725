import express, { type Express } from 'express';
import { existsSync } from 'node:fs';
import { join } from 'node:path';

const YEAR_ms = 365 * 24 * 3600 * 1000;

/**
 * The web client: its hashed files for a year, its page always asked again. A missing asset is 404 and never the page,
 * so that an old page notices that its parts are gone.
 */
export function serveWebFiles(app: Express, folder: string): void {
  if (!existsSync(join(folder, 'index.html'))) return;
  app.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: YEAR_ms, fallthrough: false, index: false }),
  );
  app.use(express.static(folder, { index: false, maxAge: 0 }));
  app.get('/{*page}', (_request, response) => {
    response.set('Cache-Control', 'no-cache');
    response.sendFile(join(folder, 'index.html'));
  });
}
