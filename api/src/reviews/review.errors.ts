import type { SignerRole } from '@brimgate/rules';
import { DomainError } from '../common/domain-error';

export class ReviewNotFound extends DomainError {
  constructor() {
    super({ status: 404, code: 'review-not-found', title: 'There is no such review among your yards' });
  }
}

export class RationNotScreened extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'ration-not-screened',
      title: 'Screen the ration as it stands first: only a screened version goes further',
    });
  }
}

/** What was screened, signed or shown is no longer what stands. */
export class ContentChanged extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'content-changed',
      title: 'The ration or a figure under it has changed since: screen it again and look at the new result',
    });
  }
}

/** Signed, sent back or released already: the same content does not go to the desk a second time. */
export class VersionDecided extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'version-decided',
      title: 'This version was decided already: change the ration and screen it before you send it again',
    });
  }
}

export class ReviewNotNeeded extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'review-not-needed',
      title: 'No finding asks for the review desk: give the reason, if one is asked for, at release',
    });
  }
}

export class ReviewClosed extends DomainError {
  constructor() {
    super({ status: 409, code: 'review-closed', title: 'This review is closed: it was decided or withdrawn' });
  }
}

export class ReviewDecided extends DomainError {
  constructor() {
    super({
      status: 409,
      code: 'review-decided',
      title: 'Somebody has signed already: the review can no longer be withdrawn',
    });
  }
}

export class SignatureNotAsked extends DomainError {
  constructor(role: SignerRole) {
    super({
      status: 409,
      code: 'signature-not-asked',
      title: `Nothing here asks for a signature as ${role === 'veterinarian' ? 'veterinarian' : 'compliance staff'}`,
    });
  }
}

export class AlreadySigned extends DomainError {
  constructor() {
    super({ status: 409, code: 'already-signed', title: 'This review has been signed in your role already' });
  }
}

export class SubmitterCannotSign extends DomainError {
  constructor() {
    super({
      status: 403,
      code: 'submitter-cannot-sign',
      title: 'Who submitted a ration cannot sign it as veterinarian',
    });
  }
}
