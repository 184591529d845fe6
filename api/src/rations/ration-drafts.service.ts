import { isDeepStrictEqual } from 'node:util';
import type { RationDraft, RationState } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { RationInReview } from './ration.errors';
import type { RationModel } from './ration.model';
import { RationVersionModel } from './ration-version.model';

const EDITED_IN_PLACE: ReadonlySet<RationState> = new Set(['draft', 'screened']);

/** As it comes back from the database: no undefined fields, no negative zero. */
const asStored = (draft: RationDraft) => JSON.parse(JSON.stringify(draft)) as RationDraft;

export const isSameDraft = (a: RationDraft, b: RationDraft): boolean => isDeepStrictEqual(asStored(a), asStored(b));

type Saved = { user: CurrentUser; ration: RationModel; newest: RationVersionModel; draft: RationDraft };

/** Which version of a ration a change goes into. */
@Injectable()
export class RationDrafts {
  async first({ user, ration, draft }: Omit<Saved, 'newest'>, transaction: Transaction): Promise<RationVersionModel> {
    return this.insert({ user, ration, number: 1, draft }, transaction);
  }

  /** Saves a changed draft and answers the version it stands in now. */
  async change({ user, ration, newest, draft }: Saved, transaction: Transaction): Promise<RationVersionModel> {
    if (!EDITED_IN_PLACE.has(newest.state)) return this.startVersion({ user, ration, newest, draft }, transaction);
    return newest.update(
      {
        draft,
        state: 'draft',
        contentHash: null,
        screeningId: null,
        savedById: user.personId,
        savedByName: user.name,
        savedAt: new Date(),
      },
      { transaction },
    );
  }

  /** What was signed, sent back or released stays as it is: the change begins a version of its own. */
  async startVersion({ user, ration, newest, draft }: Saved, transaction: Transaction): Promise<RationVersionModel> {
    if (newest.state === 'in-review') throw new RationInReview();
    await newest.update({ isNewest: false }, { transaction });
    return this.insert({ user, ration, number: newest.number + 1, draft }, transaction);
  }

  private insert(
    { user, ration, number, draft }: Omit<Saved, 'newest'> & { number: number },
    transaction: Transaction,
  ): Promise<RationVersionModel> {
    return RationVersionModel.create(
      {
        firmId: user.firmId,
        rationId: ration.id,
        number,
        isNewest: true,
        state: 'draft',
        draft,
        contentHash: null,
        screeningId: null,
        savedById: user.personId,
        savedByName: user.name,
        savedAt: new Date(),
      },
      { transaction },
    );
  }
}
