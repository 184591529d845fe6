import { DomainError, type FieldError } from '../common/domain-error';

export class RationNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'ration-not-found', title: 'There is no such ration among your yards' });
  }
}

export class RationInReview extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'ration-in-review',
      title: 'This version is at the review desk: withdraw it before you change it',
    });
  }
}

export class YardUnknown extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'input-invalid',
      title: 'Some entries need mending',
      errors: [{ path: 'yardId', message: 'This is not one of your yards' }],
    });
  }
}

/** A line or a water refers to something that is not there, or the content does not make a ration. */
export class RationContentInvalid extends DomainError {
  constructor(errors: readonly FieldError[]) {
    super({ status: 422, code: 'input-invalid', title: 'Some entries need mending', errors });
  }
}
