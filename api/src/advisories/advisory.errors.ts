import { DomainError } from '../common/domain-error';

export class AdvisoryNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'advisory-not-found', title: 'There is no such advisory among your yards' });
  }
}

export class DeliveryNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'delivery-not-found', title: 'This advisory has no such delivery' });
  }
}

export class DeliveryNotParked extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'delivery-not-parked',
      title: 'Only a delivery that was given up can be tried again: this one is sent or still under way',
    });
  }
}

export class AlreadyAcknowledged extends DomainError {
  constructor() {
    super({ status: 409, code: 'already-acknowledged', title: 'Somebody has acknowledged this advisory already' });
  }
}
