import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { Role } from '@brimgate/rules';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { CurrentUser } from '../common/current-user';
import { SessionExpired, SessionMissing } from './account.errors';

export const SESSION_HOURS = 12;
export const IDLE_MINUTES = 30;

type SessionRow = {
  sessionId: number;
  isOver: number;
  isToBeTouched: number;
  personId: number;
  personUuid: string;
  name: string;
  email: string;
  licence: string | null;
  membershipId: number;
  role: Role;
  firmId: number;
  firmUuid: string;
  firmName: string;
  yardIds: string | null;
};

// One query a request: the session, whether it still runs by the database's clock, and what the person may see.
const RESUME = `
  SELECT s.id AS sessionId,
    (s.ended_at IS NOT NULL OR s.ends_at <= UTC_TIMESTAMP(3)
      OR s.last_seen_at <= UTC_TIMESTAMP(3) - INTERVAL ${IDLE_MINUTES} MINUTE) AS isOver,
    s.last_seen_at <= UTC_TIMESTAMP(3) - INTERVAL 1 MINUTE AS isToBeTouched,
    p.id AS personId, p.uuid AS personUuid, p.name, p.email, p.licence,
    m.id AS membershipId, m.role, f.id AS firmId, f.uuid AS firmUuid, f.name AS firmName,
    (SELECT GROUP_CONCAT(y.id ORDER BY y.id) FROM yards y
      WHERE y.firm_id = m.firm_id AND (m.role = 'administrator' OR EXISTS (
        SELECT 1 FROM membership_yards my
        WHERE my.firm_id = m.firm_id AND my.membership_id = m.id AND my.yard_id = y.id))) AS yardIds
  FROM sessions s
  JOIN people p ON p.id = s.person_id AND p.is_active
  JOIN memberships m ON m.firm_id = s.firm_id AND m.id = s.membership_id AND m.is_active
  JOIN firms f ON f.id = m.firm_id
  WHERE s.token_hash = :tokenHash`;

const toCurrentUser = (row: SessionRow): CurrentUser => ({
  personId: row.personId,
  personUuid: row.personUuid,
  name: row.name,
  email: row.email,
  licence: row.licence,
  membershipId: row.membershipId,
  role: row.role,
  firmId: row.firmId,
  firmUuid: row.firmUuid,
  firmName: row.firmName,
  yardIds: row.yardIds === null ? [] : row.yardIds.split(',').map(Number),
  sessionId: row.sessionId,
});

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

/** Sessions live in the database: a token proves nothing once its row has ended. */
@Injectable()
export class SessionsService {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Starts a session and returns its token, which is stored as a hash only. */
  async start({
    personId,
    firmId,
    membershipId,
  }: Pick<CurrentUser, 'personId' | 'firmId' | 'membershipId'>): Promise<string> {
    const token = randomBytes(32).toString('base64url');
    await this.sequelize.query(
      `INSERT INTO sessions (token_hash, person_id, firm_id, membership_id, started_at, last_seen_at, ends_at)
       VALUES (:tokenHash, :personId, :firmId, :membershipId, UTC_TIMESTAMP(3), UTC_TIMESTAMP(3),
         UTC_TIMESTAMP(3) + INTERVAL ${SESSION_HOURS} HOUR)`,
      { replacements: { tokenHash: hashOf(token), personId, firmId, membershipId } },
    );
    return token;
  }

  /** The person a token stands for now. Roles and yards are read each time, so that a change bites at once. */
  async resume(token: string): Promise<CurrentUser> {
    const [row] = await this.sequelize.query<SessionRow>(RESUME, {
      replacements: { tokenHash: hashOf(token) },
      type: QueryTypes.SELECT,
    });
    if (!row) throw new SessionMissing();
    if (row.isOver) throw new SessionExpired();
    if (row.isToBeTouched) await this.touch(row.sessionId);
    return toCurrentUser(row);
  }

  async switchMembership(sessionId: number, { firmId, id }: { firmId: number; id: number }): Promise<void> {
    await this.sequelize.query('UPDATE sessions SET firm_id = :firmId, membership_id = :id WHERE id = :sessionId', {
      replacements: { firmId, id, sessionId },
    });
  }

  async end(sessionId: number): Promise<void> {
    await this.sequelize.query('UPDATE sessions SET ended_at = UTC_TIMESTAMP(3) WHERE id = :sessionId', {
      replacements: { sessionId },
    });
  }

  async endsAt(sessionId: number): Promise<Date> {
    const [row] = await this.sequelize.query<{ endsAt: Date }>(
      'SELECT ends_at AS endsAt FROM sessions WHERE id = :sessionId',
      {
        replacements: { sessionId },
        type: QueryTypes.SELECT,
      },
    );
    if (!row) throw new SessionMissing();
    return row.endsAt;
  }

  private async touch(sessionId: number): Promise<void> {
    await this.sequelize.query('UPDATE sessions SET last_seen_at = UTC_TIMESTAMP(3) WHERE id = :sessionId', {
      replacements: { sessionId },
    });
  }
}
