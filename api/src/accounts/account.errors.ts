import { DomainError } from '../common/domain-error';

export class SignInRefused extends DomainError {
  constructor() {
    super({
      status: 401,
      code: 'sign-in-refused',
      title: 'The e-mail address and the password do not belong together',
    });
  }
}

export class SessionMissing extends DomainError {
  constructor() {
    super({ status: 401, code: 'session-missing', title: 'Sign in first' });
  }
}

export class SessionExpired extends DomainError {
  constructor() {
    super({ status: 401, code: 'session-expired', title: 'Your session has ended: sign in again' });
  }
}

export class TooManyTries extends DomainError {
  constructor(retryAfterSeconds: number) {
    const minutes = Math.max(1, Math.ceil(retryAfterSeconds / 60));
    super({
      status: 429,
      code: 'too-many-tries',
      title: `Too many tries: wait ${minutes} minute${minutes === 1 ? '' : 's'} and try again`,
      retryAfterSeconds,
    });
  }
}

export class PasswordWrong extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'password-wrong',
      title: 'The password is not yours: nothing was signed',
      errors: [{ path: 'password', message: 'This is not your password' }],
    });
  }
}

export class MembershipNotFound extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'input-invalid',
      title: 'Some entries need mending',
      errors: [{ path: 'membershipId', message: 'You have no such membership' }],
    });
  }
}
