import { RequestMethod } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';
import { answerUnreadableConnections } from './common/unreadable-connections';
import { env } from './config/env';
import { serveUi } from './serve-ui';

// Radix sets styles on elements and fonts may stand in the style sheet; everything else comes from our own address.
const securityHeaders = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'none'"],
      scriptSrc: ["'self'"],
      styleSrc: ["'self'", "'unsafe-inline'"],
      fontSrc: ["'self'", 'data:'],
      imgSrc: ["'self'", 'data:'],
      connectSrc: ["'self'"],
      manifestSrc: ["'self'"],
      // The advisory is shown in a sandboxed frame made from its text.
      frameSrc: ["'self'"],
      formAction: ["'self'"],
      baseUri: ["'none'"],
      objectSrc: ["'none'"],
      frameAncestors: ["'none'"],
      ...(env.PUBLIC_URL.startsWith('https:') && { upgradeInsecureRequests: [] }),
    },
  },
  referrerPolicy: { policy: 'no-referrer' },
  xFrameOptions: { action: 'deny' },
  crossOriginEmbedderPolicy: false,
  strictTransportSecurity: env.PUBLIC_URL.startsWith('https:')
    ? { maxAge: 31_536_000, includeSubDomains: true }
    : false,
});

/** Answers hold a firm's data: no cache keeps them. */
function neverStored(_: Request, response: Response, next: NextFunction): void {
  response.setHeader('Cache-Control', 'no-store');
  next();
}

/** Everything between a connection and a controller; the same for the server and for tests. */
export function configureApp(app: NestExpressApplication): void {
  app.set('trust proxy', false);
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.disable('x-powered-by');
  app.use(securityHeaders);
  app.use(compression());
  app.use('/api', neverStored);
  app.use(cookieParser());
  app.useBodyParser('json', { limit: '256kb' });
  app.setGlobalPrefix('api', {
    exclude: [
      { path: 'livez', method: RequestMethod.GET },
      { path: 'readyz', method: RequestMethod.GET },
    ],
  });
  serveUi(app);
  answerUnreadableConnections(app.getHttpServer());
}
