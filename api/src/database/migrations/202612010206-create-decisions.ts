import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'decisions',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    uuid CHAR(36) NOT NULL,
    review_id BIGINT NOT NULL,
    signed_as VARCHAR(16) NOT NULL,
    decision VARCHAR(24) NOT NULL,
    reason TEXT NULL,
    conditions JSON NOT NULL,
    content_hash CHAR(64) NOT NULL,
    meaning VARCHAR(500) NOT NULL,
    signer_id BIGINT NOT NULL,
    signer_name VARCHAR(120) NOT NULL,
    signer_licence VARCHAR(200) NULL,
    signed_at DATETIME(3) NOT NULL,
    time_zone VARCHAR(64) NOT NULL,
    UNIQUE KEY decisions_of_firm (firm_id, id),
    UNIQUE KEY decisions_uuid (uuid),
    UNIQUE KEY decisions_one_a_role (firm_id, review_id, signed_as),
    CONSTRAINT decisions_review FOREIGN KEY (firm_id, review_id) REFERENCES reviews (firm_id, id),
    CONSTRAINT decisions_signer FOREIGN KEY (signer_id) REFERENCES people (id)
`,
);
