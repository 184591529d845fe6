import type { GateView } from '@brimgate/rules';
import { DomainError } from '../common/domain-error';

export class ReleaseNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'release-not-found', title: 'There is no such release among your yards' });
  }
}

/** Names each sign-off that is still missing. */
export class GateClosed extends DomainError {
  constructor({ requirements }: GateView) {
    super({
      status: 409,
      code: 'gate-closed',
      title: 'Sign-offs are still missing: the ration cannot be released yet',
      errors: requirements
        .filter((requirement) => !requirement.isSatisfied)
        .map(({ signOff, why, answer }) => ({ path: signOff, message: `${why} ${answer}`.trim() })),
    });
  }
}

export class AlreadyReleased extends DomainError {
  constructor() {
    super({ status: 409, code: 'already-released', title: 'This version has been released already' });
  }
}

export class ReleaseNotFed extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'release-not-standing',
      title: 'This release was superseded or stopped already: there is nothing to stop',
    });
  }
}
