import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'screening_requests',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    request_hash CHAR(64) NOT NULL,
    request JSON NOT NULL,
    UNIQUE KEY screening_requests_of_firm (firm_id, id),
    UNIQUE KEY screening_requests_hash (firm_id, request_hash)
`,
);
