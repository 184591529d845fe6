import { DomainError } from '../common/domain-error';

export class LedgerYardNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'yard-not-found', title: 'There is no such yard among yours' });
  }
}
