import type { Problem } from '@brimgate/rules';

/** What the server, or the way to it, refused; thrown by every call of the API client. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';

  constructor(readonly problem: Problem) {
    super(problem.title);
  }

  get status(): number {
    return this.problem.status;
  }

  get code(): string {
    return this.problem.code;
  }
}

const aboutUs = (status: number, code: string, title: string, detail: string): Problem => ({
  type: 'about:blank',
  title,
  status,
  code,
  detail,
  errors: [],
});

export const networkUnreachable = (): ApiProblem =>
  new ApiProblem(
    aboutUs(
      0,
      'network-unreachable',
      'The server cannot be reached',
      'Check the connection and try again. What you typed is still here.',
    ),
  );

export const replyUnreadable = (status: number): ApiProblem =>
  new ApiProblem(
    aboutUs(
      status,
      'reply-unreadable',
      'The server’s answer could not be read',
      'Try again; if it happens again, reload the page, since Brimgate may have been updated meanwhile.',
    ),
  );

/** Any fault as a problem that a page can show. */
export function problemOf(error: unknown): Problem {
  if (error instanceof ApiProblem) return error.problem;
  return aboutUs(
    0,
    'unexpected-fault',
    'Something went wrong on this page',
    error instanceof Error && error.message !== '' ? error.message : 'Reload the page and try again.',
  );
}

export const isApiProblem = (error: unknown, code?: string): error is ApiProblem =>
  error instanceof ApiProblem && (code === undefined || error.code === code);
