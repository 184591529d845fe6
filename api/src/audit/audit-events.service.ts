import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { AuditEventView } from '@brimgate/rules';
import * as v from 'valibot';
import type { CurrentUser } from '../common/current-user';
import { afterCursor, pageOf } from '../common/keyset';
import { pageEntries } from '../common/page-query';
import { ofFirm } from '../database/firm-scope';
import { YardModel } from '../yards/yard.model';
import { AuditEventModel } from './audit-event.model';
import { toAuditEventView } from './audit-event.view';

export const AuditQuery = v.strictObject({
  ...pageEntries,
  subjectId: v.optional(v.pipe(v.string('Give one identifier'), v.uuid('This is not an identifier'))),
});
export type AuditQuery = v.InferOutput<typeof AuditQuery>;

@Injectable()
export class AuditEventsService {
  constructor(@InjectModel(AuditEventModel) private readonly events: typeof AuditEventModel) {}

  async list(
    { cursor, limit, subjectId }: AuditQuery,
    user: CurrentUser,
  ): Promise<{ items: AuditEventView[]; nextCursor: string | null }> {
    const rows = await this.events.findAll({
      where: {
        ...ofFirm(user),
        ...(subjectId !== undefined && { subjectUuid: subjectId }),
        ...afterCursor(cursor, { column: 'at', direction: 'DESC' }),
      },
      include: [{ model: YardModel, attributes: ['name'], required: false }],
      order: [
        ['at', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: limit + 1,
    });
    return pageOf(rows, limit, {
      toItem: toAuditEventView,
      position: (row) => ({ at: row.at.toISOString(), id: row.id }),
    });
  }
}
