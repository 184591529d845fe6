import { randomUUID } from 'node:crypto';
import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { ThrottlerException } from '@nestjs/throttler';
import type { Problem } from '@brimgate/rules';
import type { Response } from 'express';
import { DomainError } from './domain-error';

type Answer = Omit<Problem, 'errors'> & { errors: readonly Problem['errors'][number][] };

const TITLES: Readonly<Record<number, { code: string; title: string }>> = {
  400: { code: 'request-unreadable', title: 'The request could not be read' },
  404: { code: 'not-found', title: 'There is nothing at this address' },
  413: { code: 'request-too-large', title: 'The request is larger than any form of Brimgate' },
  415: { code: 'content-type-unsupported', title: 'Send JSON in UTF-8' },
};

function problem(status: number, code: string, title: string, more: Partial<Answer> = {}): Answer {
  return { type: `urn:brimgate:problem:${code}`, title, status, code, errors: [], ...more };
}

/** The only place that turns a fault into an answer: problem+json, all faults at once, nothing of the inside. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    if (response.headersSent) {
      // A streamed answer broke off: the reader must not take it for a whole one.
      this.logger.error(error);
      response.destroy();
      return;
    }
    const answer = this.toProblem(error);
    const retryAfterSeconds = error instanceof DomainError ? error.retryAfterSeconds : undefined;
    if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', String(retryAfterSeconds));
    response.status(answer.status).type('application/problem+json').send(JSON.stringify(answer));
  }

  private toProblem(error: unknown): Answer {
    if (error instanceof DomainError) {
      const { status, code, title, errors, currentVersion } = error;
      return problem(status, code, title, { errors, ...(currentVersion !== undefined && { currentVersion }) });
    }
    if (error instanceof ThrottlerException) {
      return problem(429, 'too-many-tries', 'Too many tries: wait a few minutes and try again');
    }
    const status = error instanceof HttpException ? error.getStatus() : statusOfParser(error);
    const known = status === undefined ? undefined : TITLES[status];
    if (status !== undefined && known) return problem(status, known.code, known.title);
    if (status !== undefined && status < 500) return problem(status, 'request-refused', 'The request was refused');
    const reference = randomUUID();
    this.logger.error({ reference, err: error }, 'Unknown fault');
    return problem(500, 'unknown-fault', 'Something went wrong on our side; nothing was saved', { reference });
  }
}

/** Express's body parser and router throw plain errors that carry a status. */
function statusOfParser(error: unknown): number | undefined {
  const status = (error as { status?: unknown } | null)?.status;
  return typeof status === 'number' && status >= 400 && status < 500 ? status : undefined;
}
