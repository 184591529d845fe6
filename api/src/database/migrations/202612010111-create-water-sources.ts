import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'water_sources',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   firm_id BIGINT NOT NULL,
   yard_id BIGINT NOT NULL,
   name VARCHAR(120) NOT NULL,
   version INT NOT NULL DEFAULT 1,
   created_at DATETIME(3) NOT NULL,
   UNIQUE KEY water_sources_uuid (uuid),
   UNIQUE KEY water_sources_firm_key (firm_id, id),
   UNIQUE KEY water_sources_yard_name (firm_id, yard_id, name),
   CONSTRAINT water_sources_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id)`,
);
