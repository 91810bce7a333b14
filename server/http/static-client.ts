import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import express, { type Express } from 'express';

/** Content-hashed files are kept for good, index.html never. A wrong path under them is 404, not the page. */
export function serveClient(app: Express, folder: string): void {
  const page = path.join(folder, 'index.html');
  const forGood = { immutable: true, maxAge: '1y', index: false, fallthrough: false } as const;
  app.get(/^\/(?:_expo|assets)\/.+\.(?:js|css|ttf|json)$/, (request, response, next) => {
    // The build leaves a packed twin beside each text file.
    const packed = path.join(folder, `${request.path}.gz`);
    if (!request.acceptsEncodings('gzip') || request.path.includes('..') || !existsSync(packed))
      return next();
    response.set({
      'Content-Encoding': 'gzip',
      'Cache-Control': 'public, max-age=31536000, immutable',
      Vary: 'Accept-Encoding',
    });
    response.type(path.extname(request.path));
    response.sendFile(packed);
  });
  app.use('/_expo', express.static(path.join(folder, '_expo'), forGood));
  app.use('/assets', express.static(path.join(folder, 'assets'), forGood));
  app.use('/fonts', express.static(path.join(folder, 'fonts'), forGood));
  app.use(express.static(folder, { index: false, maxAge: 0, dotfiles: 'ignore' }));
  app.get('/{*splat}', (request, response, next) => {
    if (/^\/(api|socket\.io)(\/|$)/.test(request.path) || !request.accepts('html') || !existsSync(page))
      return next();
    response.set('Cache-Control', 'no-cache').type('html').send(readFileSync(page));
  });
}
