export type FieldError = { path: string; message: string };

type Details = {
  status: number;
  code: string;
  title: string;
  errors?: readonly FieldError[];
  currentVersion?: number;
  retryAfterSeconds?: number;
};

/** What went wrong in the trade's words; features subclass it, and problem.filter.ts alone maps it to HTTP. */
export class DomainError extends Error {
  readonly status: number;
  readonly code: string;
  readonly title: string;
  readonly errors: readonly FieldError[];
  readonly currentVersion: number | undefined;
  readonly retryAfterSeconds: number | undefined;

  constructor({ status, code, title, errors = [], currentVersion, retryAfterSeconds }: Details) {
    super(title);
    this.name = new.target.name;
    this.status = status;
    this.code = code;
    this.title = title;
    this.errors = errors;
    this.currentVersion = currentVersion;
    this.retryAfterSeconds = retryAfterSeconds;
  }
}
