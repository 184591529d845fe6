import { DomainError } from '../common/domain-error';

export class WaterSourceNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'water-source-not-found', title: 'There is no such water at your yards' });
  }
}
