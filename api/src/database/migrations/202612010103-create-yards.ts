import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'yards',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   firm_id BIGINT NOT NULL,
   name VARCHAR(120) NOT NULL,
   time_zone VARCHAR(64) NOT NULL,
   advisory_email VARCHAR(254) NOT NULL,
   compliance_gate BOOLEAN NOT NULL DEFAULT FALSE,
   cap_sign_off VARCHAR(20) NOT NULL DEFAULT 'notice',
   cap_nitrogen_kg_per_head DOUBLE NULL,
   cap_phosphorus_kg_per_head DOUBLE NULL,
   version INT NOT NULL DEFAULT 1,
   created_at DATETIME(3) NOT NULL,
   UNIQUE KEY yards_uuid (uuid),
   UNIQUE KEY yards_firm_key (firm_id, id),
   UNIQUE KEY yards_firm_name (firm_id, name),
   CONSTRAINT yards_firm FOREIGN KEY (firm_id) REFERENCES firms (id)`,
);
