import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'reviews',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    uuid CHAR(36) NOT NULL,
    yard_id BIGINT NOT NULL,
    ration_id BIGINT NOT NULL,
    ration_version_id BIGINT NOT NULL,
    version_number INT NOT NULL,
    screening_id BIGINT NOT NULL,
    content_hash CHAR(64) NOT NULL,
    reason TEXT NOT NULL,
    state VARCHAR(16) NOT NULL,
    awaits VARCHAR(40) NOT NULL,
    submitted_by_id BIGINT NOT NULL,
    submitted_by_name VARCHAR(120) NOT NULL,
    submitted_at DATETIME(3) NOT NULL,
    closed_at DATETIME(3) NULL,
    UNIQUE KEY reviews_of_firm (firm_id, id),
    UNIQUE KEY reviews_uuid (uuid),
    KEY reviews_open (firm_id, state, submitted_at, id),
    CONSTRAINT reviews_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id),
    CONSTRAINT reviews_ration FOREIGN KEY (firm_id, ration_id) REFERENCES rations (firm_id, id),
    CONSTRAINT reviews_ration_version FOREIGN KEY (firm_id, ration_version_id) REFERENCES ration_versions (firm_id, id),
    CONSTRAINT reviews_screening FOREIGN KEY (firm_id, screening_id) REFERENCES screenings (firm_id, id),
    CONSTRAINT reviews_submitted_by FOREIGN KEY (submitted_by_id) REFERENCES people (id)
`,
);
