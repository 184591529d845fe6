import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'audit_events',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   firm_id BIGINT NOT NULL,
   at DATETIME(3) NOT NULL,
   person_id BIGINT NOT NULL,
   person_name VARCHAR(120) NOT NULL,
   role VARCHAR(20) NOT NULL,
   act VARCHAR(60) NOT NULL,
   sentence VARCHAR(1000) NOT NULL,
   subject_kind VARCHAR(40) NOT NULL,
   subject_uuid CHAR(36) NOT NULL,
   subject_name VARCHAR(200) NOT NULL,
   yard_id BIGINT NULL,
   changes JSON NOT NULL,
   UNIQUE KEY audit_events_uuid (uuid),
   KEY audit_events_newest (firm_id, at, id),
   KEY audit_events_subject (firm_id, subject_uuid, at, id),
   CONSTRAINT audit_events_person FOREIGN KEY (person_id) REFERENCES people (id),
   CONSTRAINT audit_events_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id)`,
);
