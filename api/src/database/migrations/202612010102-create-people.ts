import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'people',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   name VARCHAR(120) NOT NULL,
   email VARCHAR(254) NOT NULL,
   licence VARCHAR(200) NULL,
   password_hash VARCHAR(200) NOT NULL,
   is_active BOOLEAN NOT NULL DEFAULT TRUE,
   created_at DATETIME(3) NOT NULL,
   UNIQUE KEY people_uuid (uuid),
   UNIQUE KEY people_email (email)`,
);
