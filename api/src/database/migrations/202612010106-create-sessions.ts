import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'sessions',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   token_hash CHAR(64) NOT NULL,
   person_id BIGINT NOT NULL,
   firm_id BIGINT NOT NULL,
   membership_id BIGINT NOT NULL,
   started_at DATETIME(3) NOT NULL,
   last_seen_at DATETIME(3) NOT NULL,
   ends_at DATETIME(3) NOT NULL,
   ended_at DATETIME(3) NULL,
   UNIQUE KEY sessions_token (token_hash),
   KEY sessions_ends (ends_at),
   CONSTRAINT sessions_person FOREIGN KEY (person_id) REFERENCES people (id),
   CONSTRAINT sessions_membership FOREIGN KEY (firm_id, membership_id) REFERENCES memberships (firm_id, id)`,
);
