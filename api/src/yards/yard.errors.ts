import { DomainError } from '../common/domain-error';

export class YardNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'yard-not-found', title: 'There is no such yard among yours' });
  }
}

export class YardNameTaken extends DomainError {
  constructor() {
    super({
      status: 422,
      code: 'input-invalid',
      title: 'Some entries need mending',
      errors: [{ path: 'name', message: 'Another yard of the firm has this name' }],
    });
  }
}
