import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { AuditEventView } from '@brimgate/rules';
import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../common/current-user';
import { AuditEventModel } from './audit-event.model';

type Changes = AuditEventView['changes'];

export type AuditEntry = {
  user: Pick<CurrentUser, 'personId' | 'name' | 'role' | 'firmId'>;
  /** Past tense and kebab-case: `ration-released`. */
  act: string;
  sentence: string;
  subject: { kind: string; id: string; name: string };
  yardId?: number | null;
  changes?: readonly Changes[number][];
};

@Injectable()
export class AuditService {
  constructor(@InjectModel(AuditEventModel) private readonly events: typeof AuditEventModel) {}

  /** Writes what was done, in the transaction that does it. */
  async record(transaction: Transaction, { user, act, sentence, subject, yardId, changes }: AuditEntry): Promise<void> {
    await this.events.create(
      {
        uuid: randomUUID(),
        firmId: user.firmId,
        at: new Date(),
        personId: user.personId,
        personName: user.name,
        role: user.role,
        act,
        sentence: sentence.slice(0, 1000),
        subjectKind: subject.kind,
        subjectUuid: subject.id,
        subjectName: subject.name.slice(0, 200),
        yardId: yardId ?? null,
        changes: changes ?? [],
      },
      { transaction },
    );
  }
}
