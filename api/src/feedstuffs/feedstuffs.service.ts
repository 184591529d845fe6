import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { feedstuffs as book, findFeedstuff } from '@brimgate/reference-tables/feedstuffs';
import type { FeedstuffInput, FeedstuffListItem, FeedstuffView } from '@brimgate/rules';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { type Changes, changesBetween, entered } from '../audit/changes';
import { feedstuffWords } from '../audit/field-words';
import type { CurrentUser } from '../common/current-user';
import { TransactionsService } from '../common/transactions.service';
import { DUPLICATE_KEY, errorNumber } from '../database/error-number';
import { ofFirm } from '../database/firm-scope';
import { saveVersion } from '../database/save-version';
import { BookFeedstuffFixed, FeedstuffNotFound } from './feedstuff.errors';
import { checkFeedstuff, nameTaken } from './feedstuff-input';
import { FeedstuffModel } from './feedstuff.model';
import { toBookListItem, toBookView, toFirmListItem, toFirmView } from './feedstuff.view';

// The book does not change while the program runs.
const bookItems: readonly FeedstuffListItem[] = book.map(toBookListItem);

type Recorded = {
  user: CurrentUser;
  act: 'feedstuff-entered' | 'feedstuff-changed';
  row: FeedstuffModel;
  name: string;
  changes: Changes;
};

@Injectable()
export class FeedstuffsService {
  constructor(
    @InjectModel(FeedstuffModel) private readonly feedstuffs: typeof FeedstuffModel,
    private readonly transactions: TransactionsService,
    private readonly audit: AuditService,
  ) {}

  /** The firm's own first, then the book. */
  async list(user: CurrentUser): Promise<{ items: FeedstuffListItem[]; nextCursor: null }> {
    const rows = await this.feedstuffs.findAll({ where: ofFirm(user), order: [['name', 'ASC']] });
    return { items: [...rows.map(toFirmListItem), ...bookItems], nextCursor: null };
  }

  async show(id: string, user: CurrentUser): Promise<FeedstuffView> {
    const inBook = findFeedstuff(id);
    return inBook ? toBookView(inBook) : toFirmView(await this.find(id, user));
  }

  async create(input: FeedstuffInput, user: CurrentUser): Promise<FeedstuffView> {
    checkFeedstuff(input);
    return this.naming(() =>
      this.transactions.run(async (transaction) => {
        const row = await this.feedstuffs.create(
          {
            ...input,
            uuid: randomUUID(),
            firmId: user.firmId,
            version: 1,
            savedAt: new Date(),
            savedById: user.personId,
          },
          { transaction },
        );
        const changes = entered(feedstuffWords, fieldsOf(input));
        await this.record(transaction, { user, act: 'feedstuff-entered', row, name: input.name, changes });
        return toFirmView(row);
      }),
    );
  }

  async update(
    { uuid, input, version }: { uuid: string; input: FeedstuffInput; version: number },
    user: CurrentUser,
  ): Promise<FeedstuffView> {
    if (findFeedstuff(uuid)) throw new BookFeedstuffFixed();
    checkFeedstuff(input);
    return this.naming(() =>
      this.transactions.run(async (transaction) => {
        const row = await this.find(uuid, user, transaction);
        const before = fieldsOf(row);
        const values = { ...input, savedAt: new Date(), savedById: user.personId };
        await saveVersion(this.feedstuffs, { firmId: row.firmId, id: row.id, version }, values, transaction);
        const changes = changesBetween(feedstuffWords, before, fieldsOf(input));
        await this.record(transaction, { user, act: 'feedstuff-changed', row, name: input.name, changes });
        return toFirmView(await this.find(uuid, user, transaction));
      }),
    );
  }

  private async find(uuid: string, user: CurrentUser, transaction: Transaction | null = null): Promise<FeedstuffModel> {
    const row = await this.feedstuffs.findOne({ where: { ...ofFirm(user), uuid }, transaction });
    if (!row) throw new FeedstuffNotFound();
    return row;
  }

  private record(transaction: Transaction, { user, act, row, name, changes }: Recorded): Promise<void> {
    return this.audit.record(transaction, {
      user,
      act,
      sentence: `${act === 'feedstuff-entered' ? 'Entered' : 'Changed'} the feedstuff ${name}`,
      subject: { kind: 'feedstuff', id: row.uuid, name },
      changes,
    });
  }

  private async naming<T>(save: () => Promise<T>): Promise<T> {
    try {
      return await save();
    } catch (error) {
      throw errorNumber(error) === DUPLICATE_KEY ? nameTaken() : error;
    }
  }
}

/** What was analysed beside the other fields, so that the audit trail tells each nutrient by itself. */
const fieldsOf = ({
  name,
  bookFeedstuffId,
  analysedOn,
  laboratory,
  note,
  analysed,
}: FeedstuffInput): Record<string, unknown> => ({
  ...analysed,
  name,
  bookFeedstuffId,
  analysedOn,
  laboratory,
  note,
});
