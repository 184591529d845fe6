import { randomUUID } from 'node:crypto';
import {
  type FindingStatus,
  type RationContent,
  type RationView,
  type Screening,
  type ScreeningView,
  screen,
} from '@brimgate/rules';
import { Injectable } from '@nestjs/common';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { contentOf } from '../audit/changes';
import type { CurrentUser } from '../common/current-user';
import { TransactionsService } from '../common/transactions.service';
import { ofYards } from '../database/firm-scope';
import { saveVersion } from '../database/save-version';
import { RationDrafts } from '../rations/ration-drafts.service';
import { RationInReview } from '../rations/ration.errors';
import { RationFacts, type ResolvedRation } from '../rations/ration-facts.service';
import { RationLookup } from '../rations/ration-lookup.service';
import { RationModel } from '../rations/ration.model';
import { RationsService } from '../rations/rations.service';
import { RationViews } from '../rations/ration-views.service';
import type { RationVersionModel } from '../rations/ration-version.model';
import { YardModel } from '../yards/yard.model';
import { CurrentScreening } from './current-screening.service';
import { headlineOf } from './headline';
import { ScreeningNotFound } from './screening.errors';
import { ScreeningRequestModel } from './screening-request.model';
import { ScreeningRequests } from './screening-requests.service';
import { ScreeningModel } from './screening.model';
import { toScreeningView } from './screening.view';

type Create = { rationId: string; content: RationContent; version: number; user: CurrentUser };
type Screened = { user: CurrentUser; ration: RationModel; version: RationVersionModel; resolved: ResolvedRation };

/** Screens rations and keeps what was found. */
@Injectable()
export class ScreeningsService {
  constructor(
    private readonly transactions: TransactionsService,
    private readonly lookup: RationLookup,
    private readonly rations: RationsService,
    private readonly drafts: RationDrafts,
    private readonly facts: RationFacts,
    private readonly requests: ScreeningRequests,
    private readonly current: CurrentScreening,
    private readonly views: RationViews,
    private readonly audit: AuditService,
  ) {}

  async view({ user, screeningId }: { user: CurrentUser; screeningId: string }): Promise<ScreeningView> {
    const screening = await ScreeningModel.findOne({
      where: { ...ofYards(user), uuid: screeningId },
      include: [ScreeningRequestModel, { model: RationModel, attributes: ['uuid', 'name'] }],
    });
    if (!screening) throw new ScreeningNotFound();
    return toScreeningView(screening, screening.ration);
  }

  /** Saves what changed, resolves the figures, screens and stores, all or nothing. */
  create({ rationId, content, version, user }: Create): Promise<RationView> {
    return this.transactions.run(async (transaction) => {
      const ration = await this.lookup.lockAt({ user, rationId, version }, transaction);
      const newest = await this.lookup.newestVersion(ration, transaction);
      const yard = await YardModel.findOne({ where: { firmId: user.firmId, id: ration.yardId }, transaction });
      if (!yard) throw new Error(`Ration ${ration.uuid} has no yard`);
      const resolved = await this.facts.resolve({ user, yard, content }, transaction);
      const saved = await this.rations.saveChanges(
        { user, ration, newest, name: ration.name, draft: content },
        transaction,
      );
      const target = await this.versionFor({ user, ration, version: saved, resolved }, transaction);
      if (target !== null) await this.store({ user, ration, version: target, resolved }, transaction);
      return this.views.view({ user, rationId }, transaction);
    });
  }

  /**
   * The version a screening goes into; null when this very screening stands already.
   * A version that was signed or released keeps its screening: other figures under it begin a new version.
   */
  private async versionFor(screened: Screened, transaction: Transaction): Promise<RationVersionModel | null> {
    const { user, ration, version, resolved } = screened;
    if (version.screeningId === null) return version;
    const standing = await this.current.load({ firmId: user.firmId, id: version.screeningId }, transaction);
    if (isSameScreening(standing, resolved)) return null;
    if (version.state === 'in-review') throw new RationInReview();
    if (version.state === 'screened') return version;
    return this.drafts.startVersion({ user, ration, newest: version, draft: version.draft }, transaction);
  }

  private async store({ user, ration, version, resolved }: Screened, transaction: Transaction): Promise<void> {
    const screening = screen(resolved.request);
    const follows = await ScreeningModel.max<number | null, ScreeningModel>('id', {
      where: { firmId: user.firmId, rationId: ration.id },
      transaction,
    });
    const row = await ScreeningModel.create(
      {
        ...namesOf({ user, ration, version, resolved }),
        ...summaryOf(screening),
        requestId: await this.requests.store({ firmId: user.firmId, ...resolved }, transaction),
        followsId: follows,
        screening,
      },
      { transaction },
    );
    await version.update(
      { state: 'screened', contentHash: resolved.contentHash, screeningId: row.id },
      { transaction },
    );
    ration.version = await saveVersion(RationModel, ration, {}, transaction);
    await this.audit.record(transaction, {
      user,
      act: 'ration-screened',
      sentence: `Screened version ${version.number} of ${ration.name}: ${VERDICT_WORDS[screening.verdict]}`,
      subject: { kind: 'ration', id: ration.uuid, name: ration.name },
      yardId: ration.yardId,
      changes: contentOf(resolved.contentHash),
    });
  }
}

const VERDICT_WORDS: Readonly<Record<FindingStatus, string>> = {
  within: 'within its limits',
  near: 'near a limit',
  over: 'over a limit',
  undetermined: 'not determined',
};

// The content hash names rules and edition as well: newer ones on the same figures are another screening.
const isSameScreening = (standing: ScreeningModel, { contentHash }: ResolvedRation) =>
  standing.contentHash === contentHash;

const namesOf = ({ user, ration, version, resolved }: Screened) => ({
  firmId: user.firmId,
  uuid: randomUUID(),
  yardId: ration.yardId,
  rationId: ration.id,
  rationVersionId: version.id,
  versionNumber: version.number,
  contentHash: resolved.contentHash,
  screenedById: user.personId,
  screenedByName: user.name,
  screenedAt: new Date(),
});

const summaryOf = (screening: Screening) => ({
  rulesVersion: screening.rulesVersion,
  edition: screening.edition,
  verdict: screening.verdict,
  signOff: screening.signOff,
  sulfurPctDm: screening.totals.sulfurPctDm,
  headline: headlineOf(screening),
});
