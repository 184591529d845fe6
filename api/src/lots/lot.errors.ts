import { DomainError, type FieldError } from '../common/domain-error';

export class LotNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'lot-not-found', title: 'There is no such lot among your yards' });
  }
}

/** A lot refers to a yard or a release that is not there. */
export class LotInvalid extends DomainError {
  constructor(errors: readonly FieldError[]) {
    super({ status: 422, code: 'input-invalid', title: 'Some entries need mending', errors });
  }
}
