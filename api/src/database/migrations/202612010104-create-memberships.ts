import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'memberships',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   firm_id BIGINT NOT NULL,
   person_id BIGINT NOT NULL,
   role VARCHAR(20) NOT NULL,
   is_active BOOLEAN NOT NULL DEFAULT TRUE,
   created_at DATETIME(3) NOT NULL,
   UNIQUE KEY memberships_uuid (uuid),
   UNIQUE KEY memberships_firm_key (firm_id, id),
   UNIQUE KEY memberships_person_role (firm_id, person_id, role),
   KEY memberships_person (person_id),
   CONSTRAINT memberships_firm FOREIGN KEY (firm_id) REFERENCES firms (id),
   CONSTRAINT memberships_person FOREIGN KEY (person_id) REFERENCES people (id)`,
);
