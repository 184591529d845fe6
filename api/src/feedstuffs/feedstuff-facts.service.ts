import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import type { Composition, CompositionSpread, FeedstuffListItem } from '@brimgate/rules';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { ofFirm } from '../database/firm-scope';
import { FeedstuffModel } from './feedstuff.model';
import { toBookListItem, toFirmListItem } from './feedstuff.view';

export type FeedstuffFacts = {
  id: string;
  name: string;
  composition: Composition;
  spread: CompositionSpread;
  /** What the composition is, in words. */
  label: string;
};

const toFacts = ({ id, name, composition, spread, compositionLabel }: FeedstuffListItem): FeedstuffFacts => ({
  id,
  name,
  composition,
  spread,
  label: compositionLabel,
});

/** The facts that a ration's lines refer to. */
@Injectable()
export class FeedstuffFactsService {
  constructor(@InjectModel(FeedstuffModel) private readonly feedstuffs: typeof FeedstuffModel) {}

  /** Facts by id, of the book and of the firm, with one query at most; an unknown or foreign id is not in the answer. */
  async resolveFeedstuffs(
    transaction: Transaction | null,
    user: Pick<CurrentUser, 'firmId'>,
    ids: readonly string[],
  ): Promise<ReadonlyMap<string, FeedstuffFacts>> {
    const facts = new Map<string, FeedstuffFacts>();
    const own: string[] = [];
    for (const id of new Set(ids)) {
      const book = findFeedstuff(id);
      if (book) facts.set(id, toFacts(toBookListItem(book)));
      else own.push(id);
    }
    if (own.length === 0) return facts;
    const rows = await this.feedstuffs.findAll({ where: { ...ofFirm(user), uuid: own }, transaction });
    for (const row of rows) facts.set(row.uuid, toFacts(toFirmListItem(row)));
    return facts;
  }
}
