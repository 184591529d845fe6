import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'advisories',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    uuid CHAR(36) NOT NULL,
    yard_id BIGINT NOT NULL,
    ration_id BIGINT NOT NULL,
    release_id BIGINT NOT NULL,
    version_number INT NOT NULL,
    kind VARCHAR(8) NOT NULL,
    subject VARCHAR(300) NOT NULL,
    html MEDIUMTEXT NOT NULL,
    text MEDIUMTEXT NOT NULL,
    written_at DATETIME(3) NOT NULL,
    acknowledged_by_id BIGINT NULL,
    acknowledged_by_name VARCHAR(120) NULL,
    acknowledged_at DATETIME(3) NULL,
    UNIQUE KEY advisories_of_firm (firm_id, id),
    UNIQUE KEY advisories_uuid (uuid),
    UNIQUE KEY advisories_one_a_kind (firm_id, release_id, kind),
    KEY advisories_newest (firm_id, written_at, id),
    CONSTRAINT advisories_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id),
    CONSTRAINT advisories_ration FOREIGN KEY (firm_id, ration_id) REFERENCES rations (firm_id, id),
    CONSTRAINT advisories_release FOREIGN KEY (firm_id, release_id) REFERENCES releases (firm_id, id),
    CONSTRAINT advisories_acknowledged_by FOREIGN KEY (acknowledged_by_id) REFERENCES people (id)
`,
);
