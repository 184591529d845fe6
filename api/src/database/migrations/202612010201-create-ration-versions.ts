import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'ration_versions',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    ration_id BIGINT NOT NULL,
    number INT NOT NULL,
    is_newest BOOLEAN NOT NULL,
    state VARCHAR(16) NOT NULL,
    draft JSON NOT NULL,
    content_hash CHAR(64) NULL,
    screening_id BIGINT NULL,
    saved_by_id BIGINT NOT NULL,
    saved_by_name VARCHAR(120) NOT NULL,
    saved_at DATETIME(3) NOT NULL,
    UNIQUE KEY ration_versions_of_firm (firm_id, id),
    UNIQUE KEY ration_versions_number (firm_id, ration_id, number),
    KEY ration_versions_newest (firm_id, is_newest, saved_at, id),
    CONSTRAINT ration_versions_ration FOREIGN KEY (firm_id, ration_id) REFERENCES rations (firm_id, id),
    CONSTRAINT ration_versions_saved_by FOREIGN KEY (saved_by_id) REFERENCES people (id)
`,
);
