import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'feedstuffs',
  `id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
   uuid CHAR(36) NOT NULL,
   firm_id BIGINT NOT NULL,
   name VARCHAR(120) NOT NULL,
   book_feedstuff_id VARCHAR(80) NULL,
   analysed_on DATE NULL,
   laboratory VARCHAR(500) NULL,
   note VARCHAR(500) NULL,
   analysed JSON NOT NULL,
   version INT NOT NULL DEFAULT 1,
   saved_at DATETIME(3) NOT NULL,
   saved_by_id BIGINT NOT NULL,
   UNIQUE KEY feedstuffs_uuid (uuid),
   UNIQUE KEY feedstuffs_firm_key (firm_id, id),
   UNIQUE KEY feedstuffs_firm_name (firm_id, name),
   CONSTRAINT feedstuffs_firm FOREIGN KEY (firm_id) REFERENCES firms (id),
   CONSTRAINT feedstuffs_saved_by FOREIGN KEY (saved_by_id) REFERENCES people (id)`,
);
