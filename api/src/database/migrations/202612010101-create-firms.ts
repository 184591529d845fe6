import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'firms',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   name VARCHAR(120) NOT NULL,
   created_at DATETIME(3) NOT NULL,
   UNIQUE KEY firms_uuid (uuid)`,
);
