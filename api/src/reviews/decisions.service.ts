import { randomUUID } from 'node:crypto';
import type { DecisionInput, ReviewState, ReviewView, SignerRole } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { PasswordService } from '../accounts/password.service';
import { AuditService } from '../audit/audit.service';
import { contentOf, told } from '../audit/changes';
import type { CurrentUser } from '../common/current-user';
import { IdempotencyService } from '../common/idempotency.service';
import { saveVersion } from '../database/save-version';
import { RationModel } from '../rations/ration.model';
import { CurrentScreening } from '../screenings/current-screening.service';
import { YardModel } from '../yards/yard.model';
import { DecisionModel } from './decision.model';
import { meaningOf } from './decision-meaning';
import { awaitedSigners, gateOf } from './gate';
import { ContentChanged, SignatureNotAsked } from './review.errors';
import { ReviewDesk } from './review-desk.service';
import { type LockedReview, ReviewLookup } from './review-lookup.service';
import { refusalToSign, signerRoleOf } from './signing';

type Decide = { reviewId: string; input: DecisionInput; key: string; user: CurrentUser };
type Signature = LockedReview & { user: CurrentUser; role: SignerRole; input: DecisionInput; yard: YardModel };

/** Signs at the review desk. */
@Injectable()
export class DecisionsService {
  constructor(
    private readonly idempotency: IdempotencyService,
    private readonly reviews: ReviewLookup,
    private readonly current: CurrentScreening,
    private readonly passwords: PasswordService,
    private readonly desk: ReviewDesk,
    private readonly audit: AuditService,
  ) {}

  async decide({ reviewId, input, key, user }: Decide): Promise<ReviewView> {
    const rationId = await this.reviews.rationIdOf({ user, reviewId });
    const role = signerRoleOf(user.role);
    if (role === null) throw new SignatureNotAsked('veterinarian');
    // Before the transaction: hashing a password takes too long to hold a ration for.
    await this.passwords.verifyPassword(user, input.password);
    const route = `POST /api/reviews/${reviewId}/decisions`;
    return this.idempotency.once({ user, route, key, body: input }, async (transaction) => {
      const locked = await this.reviews.lock({ user, reviewId, rationId }, transaction);
      const refusal = refusalToSign({ user, role, review: locked.review, decisions: locked.review.decisions });
      if (refusal) throw refusal;
      const yard = await this.yardOf(locked.ration, transaction);
      await this.sign({ ...locked, user, role, input, yard }, transaction);
      return this.desk.view({ user, reviewId }, transaction);
    });
  }

  private async sign(signature: Signature, transaction: Transaction): Promise<void> {
    const { user, ration, version, review, input, yard } = signature;
    if (input.contentHash !== review.contentHash || version.contentHash !== review.contentHash)
      throw new ContentChanged();
    const screening = await this.current.load({ firmId: user.firmId, id: review.screeningId }, transaction);
    // What no longer stands can be sent back, but not agreed to.
    if (input.decision !== 'send-back')
      await this.current.assertFactsStand({ user, ration, newest: version, screening }, transaction);
    review.decisions = [...review.decisions, await this.insert(signature, transaction)];
    const awaits = input.decision === 'send-back' ? [] : awaitedSigners(gateOf({ screening, review, yard }));
    const state = stateAfter(input, awaits);
    await review.update(
      { state, awaits: awaits.join(','), closedAt: state === 'open' ? null : new Date() },
      { transaction },
    );
    if (state !== 'open') await version.update({ state }, { transaction });
    await saveVersion(RationModel, ration, {}, transaction);
    await this.record(signature, transaction);
  }

  private insert({ user, role, review, input, yard }: Signature, transaction: Transaction): Promise<DecisionModel> {
    return DecisionModel.create(
      {
        firmId: user.firmId,
        uuid: randomUUID(),
        reviewId: review.id,
        signedAs: role,
        decision: input.decision,
        reason: input.reason,
        conditions: input.decision === 'concur-with-conditions' ? input.conditions : [],
        contentHash: input.contentHash,
        meaning: meaningOf(role, input.decision),
        signerId: user.personId,
        signerName: user.name,
        signerLicence: user.licence,
        signedAt: new Date(),
        timeZone: yard.timeZone,
      },
      { transaction },
    );
  }

  private record({ user, role, ration, review, input }: Signature, transaction: Transaction): Promise<unknown> {
    return this.audit.record(transaction, {
      user,
      act: input.decision === 'send-back' ? 'review-sent-back' : 'review-signed',
      sentence: `${DEEDS[input.decision]} version ${review.versionNumber} of ${ration.name}, ${SIGNED_AS[role]}`,
      subject: { kind: 'ration', id: ration.uuid, name: ration.name },
      yardId: ration.yardId,
      changes: [
        ...contentOf(input.contentHash),
        ...told('Reason', input.reason),
        ...input.conditions.flatMap((condition) => told('Condition', condition)),
      ],
    });
  }

  private async yardOf(ration: RationModel, transaction: Transaction): Promise<YardModel> {
    const yard = await YardModel.findOne({ where: { firmId: ration.firmId, id: ration.yardId }, transaction });
    if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
    return yard;
  }
}

const DEEDS: Readonly<Record<DecisionInput['decision'], string>> = {
  concur: 'Concurred with',
  'concur-with-conditions': 'Concurred, under conditions, with',
  'send-back': 'Sent back',
};

const SIGNED_AS: Readonly<Record<SignerRole, string>> = {
  veterinarian: 'signing as veterinarian',
  compliance: 'signing for compliance',
};

/** One who sends back ends the review at once; otherwise it is signed when nobody at the desk is awaited any more. */
function stateAfter(input: DecisionInput, awaits: readonly SignerRole[]): Exclude<ReviewState, 'withdrawn'> {
  if (input.decision === 'send-back') return 'sent-back';
  return awaits.length === 0 ? 'signed' : 'open';
}
