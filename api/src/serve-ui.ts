import { existsSync } from 'node:fs';
import { isAbsolute, join, resolve } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { static as serveStatic, type NextFunction, type Request, type Response } from 'express';
import { env } from './config/env';

const SERVER_PATHS = /^\/(?:api|livez|readyz)(?:\/|$)/;
const YEAR_SECONDS = 31_536_000;

/** `api` itself, whether this file runs from src or from dist/src. */
const apiFolder = __dirname.includes(join('dist', 'src')) ? resolve(__dirname, '../..') : resolve(__dirname, '..');

function uiFolder(): string {
  if (env.UI_FOLDER === '') return resolve(apiFolder, '../ui/dist');
  return isAbsolute(env.UI_FOLDER) ? env.UI_FOLDER : resolve(apiFolder, env.UI_FOLDER);
}

/**
 * The built pages. Files with a hash in their name never change and are kept for a year; the page itself is asked for
 * each time. An address that is no file is a page of the application, so it gets the same HTML.
 */
export function serveUi(app: NestExpressApplication): void {
  const folder = uiFolder();
  const page = join(folder, 'index.html');
  const files = serveStatic(folder, { index: false, maxAge: 0, etag: true });
  app.use(
    '/assets',
    serveStatic(join(folder, 'assets'), {
      immutable: true,
      maxAge: YEAR_SECONDS * 1000,
      index: false,
      fallthrough: false,
    }),
  );
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (SERVER_PATHS.test(request.path)) next();
    else files(request, response, next);
  });
  app.use((request: Request, response: Response, next: NextFunction) => {
    const isRead = request.method === 'GET' || request.method === 'HEAD';
    if (!isRead || SERVER_PATHS.test(request.path) || !existsSync(page)) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page);
  });
}
