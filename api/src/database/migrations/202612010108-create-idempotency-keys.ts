import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'idempotency_keys',
  `firm_id BIGINT NOT NULL,
   person_id BIGINT NOT NULL,
   route VARCHAR(200) NOT NULL,
   idempotency_key CHAR(36) NOT NULL,
   body_hash CHAR(64) NOT NULL,
   answer JSON NULL,
   created_at DATETIME(3) NOT NULL,
   PRIMARY KEY (firm_id, person_id, route, idempotency_key),
   KEY idempotency_keys_created (created_at),
   CONSTRAINT idempotency_keys_firm FOREIGN KEY (firm_id) REFERENCES firms (id),
   CONSTRAINT idempotency_keys_person FOREIGN KEY (person_id) REFERENCES people (id)`,
);
