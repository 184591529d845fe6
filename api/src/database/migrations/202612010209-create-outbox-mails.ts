import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'outbox_mails',
  `
    id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    firm_id BIGINT NOT NULL,
    uuid CHAR(36) NOT NULL,
    advisory_id BIGINT NOT NULL,
    recipient VARCHAR(254) NOT NULL,
    role VARCHAR(16) NOT NULL,
    message_id VARCHAR(200) NOT NULL,
    state VARCHAR(8) NOT NULL,
    attempts INT NOT NULL,
    last_error VARCHAR(1000) NULL,
    due_at DATETIME(3) NULL,
    lease_token CHAR(36) NULL,
    sent_at DATETIME(3) NULL,
    UNIQUE KEY outbox_mails_of_firm (firm_id, id),
    UNIQUE KEY outbox_mails_uuid (uuid),
    UNIQUE KEY outbox_mails_message (message_id),
    KEY outbox_mails_due (due_at, id),
    KEY outbox_mails_undelivered (firm_id, state),
    CONSTRAINT outbox_mails_advisory FOREIGN KEY (firm_id, advisory_id) REFERENCES advisories (firm_id, id)
`,
);
