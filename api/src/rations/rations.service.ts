import { randomUUID } from 'node:crypto';
import type { RationCreateInput, RationDraft, RationSaveInput, RationView } from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import type { CurrentUser } from '../common/current-user';
import { TransactionsService } from '../common/transactions.service';
import { saveVersion } from '../database/save-version';
import { YardModel } from '../yards/yard.model';
import { isSameDraft, RationDrafts } from './ration-drafts.service';
import { RationInReview, YardUnknown } from './ration.errors';
import { RationFacts } from './ration-facts.service';
import { RationLookup } from './ration-lookup.service';
import { RationModel } from './ration.model';
import { RationViews } from './ration-views.service';
import type { RationVersionModel } from './ration-version.model';

type Create = { input: RationCreateInput; user: CurrentUser };
type Save = { rationId: string; input: RationSaveInput; version: number; user: CurrentUser };
type Ration = { user: CurrentUser; ration: RationModel };
type Changes = Ration & { newest: RationVersionModel; name: string; draft: RationDraft };
type Recorded = Ration & { saved: RationVersionModel; name: string; draftChanged: boolean };

const EMPTY_DRAFT: RationDraft = { cattle: {}, lines: [], waters: [], waterIntake: null };

/** Creates and saves rations. */
@Injectable()
export class RationsService {
  constructor(
    private readonly transactions: TransactionsService,
    private readonly lookup: RationLookup,
    private readonly drafts: RationDrafts,
    private readonly facts: RationFacts,
    private readonly views: RationViews,
    private readonly audit: AuditService,
  ) {}

  create({ input, user }: Create): Promise<RationView> {
    return this.transactions.run(async (transaction) => {
      const yard = await this.yardOf(user, input.yardId, transaction);
      const draft = input.draft ?? EMPTY_DRAFT;
      await this.facts.assertKnown({ user, yardId: yard.id, draft }, transaction);
      const ration = await RationModel.create(
        {
          firmId: user.firmId,
          uuid: randomUUID(),
          yardId: yard.id,
          name: input.name,
          releasedVersionNumber: null,
          version: 1,
        },
        { transaction },
      );
      await this.drafts.first({ user, ration, draft }, transaction);
      await this.audit.record(transaction, {
        user,
        act: 'ration-created',
        sentence: `Began the ration ${ration.name} for ${yard.name}`,
        subject: { kind: 'ration', id: ration.uuid, name: ration.name },
        yardId: yard.id,
      });
      return this.views.view({ user, rationId: ration.uuid }, transaction);
    });
  }

  save({ rationId, input, version, user }: Save): Promise<RationView> {
    return this.transactions.run(async (transaction) => {
      const ration = await this.lookup.lockAt({ user, rationId, version }, transaction);
      const newest = await this.lookup.newestVersion(ration, transaction);
      await this.saveChanges({ user, ration, newest, name: input.name, draft: input.draft }, transaction);
      return this.views.view({ user, rationId }, transaction);
    });
  }

  /** Writes what differs, and says so in the audit trail; answers the version that the draft stands in now. */
  async saveChanges(
    { user, ration, newest, name, draft }: Changes,
    transaction: Transaction,
  ): Promise<RationVersionModel> {
    const draftChanged = !isSameDraft(newest.draft, draft);
    if (!draftChanged && name === ration.name) return newest;
    if (newest.state === 'in-review') throw new RationInReview();
    if (draftChanged) await this.facts.assertKnown({ user, yardId: ration.yardId, draft }, transaction);
    const saved = draftChanged ? await this.drafts.change({ user, ration, newest, draft }, transaction) : newest;
    await this.recordSaved({ user, ration, name, saved, draftChanged }, transaction);
    ration.version = await saveVersion(RationModel, ration, { name }, transaction);
    ration.name = name;
    return saved;
  }

  private recordSaved(
    { user, ration, name, saved, draftChanged }: Recorded,
    transaction: Transaction,
  ): Promise<unknown> {
    const renamed = name !== ration.name;
    return this.audit.record(transaction, {
      user,
      act: draftChanged ? 'ration-saved' : 'ration-renamed',
      sentence: draftChanged ? `Saved version ${saved.number} of ${name}` : `Renamed ${ration.name} to ${name}`,
      subject: { kind: 'ration', id: ration.uuid, name },
      yardId: ration.yardId,
      changes: renamed ? [{ field: 'Name', before: ration.name, after: name }] : [],
    });
  }

  private async yardOf(user: CurrentUser, uuid: string, transaction: Transaction): Promise<YardModel> {
    const yard = await YardModel.findOne({ where: { firmId: user.firmId, id: [...user.yardIds], uuid }, transaction });
    if (!yard) throw new YardUnknown();
    return yard;
  }
}
