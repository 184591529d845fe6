import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'rations',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    uuid CHAR(36) NOT NULL,
    yard_id BIGINT NOT NULL,
    name VARCHAR(120) NOT NULL,
    released_version_number INT NULL,
    version INT NOT NULL,
    UNIQUE KEY rations_of_firm (firm_id, id),
    UNIQUE KEY rations_uuid (uuid),
    KEY rations_of_yard (firm_id, yard_id),
    CONSTRAINT rations_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id)
`,
);
