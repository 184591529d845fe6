import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Response } from 'express';
import { type Observable, tap } from 'rxjs';

/** Every answer with a version carries it as ETag, ready to go back in If-Match. */
@Injectable()
export class EtagInterceptor implements NestInterceptor {
  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const response = context.switchToHttp().getResponse<Response>();
    return next.handle().pipe(
      tap((answer: unknown) => {
        const version = (answer as { version?: unknown } | null | undefined)?.version;
        if (typeof version === 'number' && !response.headersSent) response.setHeader('ETag', `"${version}"`);
      }),
    );
  }
}
