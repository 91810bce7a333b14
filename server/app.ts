import { randomUUID } from 'node:crypto';
import compression from 'compression';
import express, { type Express, type Router } from 'express';
import pinoHttp from 'pino-http';
import { errorHandler, securityHeaders, serveClient } from './http';
import type { Logger } from './lib/log';
import { notFound } from './lib/problem';

/**
 * Half a character (a cut emoji) is no text the database takes: the sign for "unreadable" stands in its place.
 * Walking every value also refuses what is nested too deep to be walked.
 */
function mendText(_key: string, value: unknown): unknown {
  return typeof value === 'string' ? value.replace(/\p{Surrogate}/gu, '\uFFFD') : value;
}

/** Everything around the routes: ids, log, headers, body limits, the client's files, errors. */
export function createApp(
  api: Router,
  clientFolder: string,
  log: Logger,
  isReady: () => Promise<boolean>,
): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('query parser', 'simple');
  app.use(
    pinoHttp({
      logger: log,
      genReqId: () => randomUUID(),
      autoLogging: { ignore: (request) => !request.url?.startsWith('/api/') },
      customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'error' : 'debug'),
    }),
  );
  app.use(securityHeaders(clientFolder));
  app.get('/healthz', (_request, response) => {
    response.type('text').send('alive');
  });
  app.get('/readyz', async (_request, response) => {
    const ready = await isReady();
    response
      .status(ready ? 200 : 503)
      .type('text')
      .send(ready ? 'ready' : 'not ready');
  });
  app.use('/api', compression(), (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api/v1', express.json({ limit: '2mb', strict: true, reviver: mendText }), api);
  app.use('/api', () => {
    throw notFound('address');
  });
  serveClient(app, clientFolder);
  app.use(() => {
    throw notFound('address');
  });
  app.use(errorHandler);
  return app;
}
