import { DomainError } from '../common/domain-error';

export class ScreeningNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'screening-not-found', title: 'There is no such screening among your yards' });
  }
}
