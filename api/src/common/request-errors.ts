import { DomainError, type FieldError } from './domain-error';

export class InputInvalid extends DomainError {
  constructor(errors: readonly FieldError[]) {
    super({ status: 422, code: 'input-invalid', title: 'Some entries need mending', errors });
  }
}

export class BodyUnreadable extends DomainError {
  constructor() {
    super({ status: 400, code: 'body-unreadable', title: 'The request could not be read: send JSON' });
  }
}

export class IfMatchMissing extends DomainError {
  constructor() {
    super({
      status: 428,
      code: 'if-match-missing',
      title: 'Say which version you saw: the If-Match header is missing',
    });
  }
}

export class IfMatchUnreadable extends DomainError {
  constructor() {
    super({
      status: 400,
      code: 'if-match-unreadable',
      title: 'If-Match holds a version in quotation marks, such as "3"',
    });
  }
}

export class IdempotencyKeyMissing extends DomainError {
  constructor() {
    super({
      status: 400,
      code: 'idempotency-key-missing',
      title: 'This acts only once: send an Idempotency-Key header with a UUID',
    });
  }
}

export class IdempotencyKeyReused extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'idempotency-key-reused',
      title: 'This Idempotency-Key was used with another request: use a new one',
    });
  }
}

export class IdempotencyInFlight extends DomainError {
  constructor() {
    super({ status: 409, code: 'request-in-flight', title: 'The same request is still being worked on' });
  }
}

export class CursorUnreadable extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'input-invalid',
      title: 'Some entries need mending',
      errors: [{ path: 'cursor', message: 'This is not a cursor of this list: start again without one' }],
    });
  }
}
