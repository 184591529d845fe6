import type { Role, SignerRole } from '@brimgate/rules';
import type { CurrentUser } from '../common/current-user';
import type { DomainError } from '../common/domain-error';
import type { DecisionModel } from './decision.model';
import { AlreadySigned, ReviewClosed, SignatureNotAsked, SubmitterCannotSign } from './review.errors';
import { awaitedOf, type ReviewModel } from './review.model';

export const signerRoleOf = (role: Role): SignerRole | null =>
  role === 'veterinarian' || role === 'compliance' ? role : null;

type Signing = {
  user: Pick<CurrentUser, 'personId'>;
  role: SignerRole;
  review: Pick<ReviewModel, 'state' | 'awaits' | 'submittedById'>;
  decisions: readonly Pick<DecisionModel, 'signedAs'>[];
};

/** Why this person may not sign now; null when they may. The page and the server ask the same question. */
export function refusalToSign({ user, role, review, decisions }: Signing): DomainError | null {
  if (review.state !== 'open') return new ReviewClosed();
  if (role === 'veterinarian' && review.submittedById === user.personId) return new SubmitterCannotSign();
  if (decisions.some((decision) => decision.signedAs === role)) return new AlreadySigned();
  if (!awaitedOf(review).includes(role)) return new SignatureNotAsked(role);
  return null;
}
