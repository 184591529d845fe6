import { randomUUID } from 'node:crypto';
import type { IncomingMessage } from 'node:http';
import type { Params } from 'nestjs-pino';
import { env } from '../config/env';
import type { CurrentUser } from './current-user';

type Signed = IncomingMessage & { user?: CurrentUser };

/** JSON lines with who, what and how long; never a password, cookie or token. */
export const loggingOptions: Params = {
  // Express 5 names the rest of a path.
  forRoutes: ['{*path}'],
  pinoHttp: {
    level: env.LOG_LEVEL,
    genReqId: () => randomUUID(),
    autoLogging: { ignore: ({ url }) => url === '/livez' || url === '/readyz' },
    redact: {
      paths: [
        'req.headers.cookie',
        'req.headers.authorization',
        'res.headers["set-cookie"]',
        '*.password',
        '*.passwordHash',
      ],
      censor: '[hidden]',
    },
    customProps: (request: Signed) =>
      request.user === undefined ? {} : { person: request.user.personUuid, firm: request.user.firmUuid },
    serializers: {
      req: ({ id, method, url }: { id: string; method: string; url: string }) => ({ id, method, url }),
      res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    },
  },
};
