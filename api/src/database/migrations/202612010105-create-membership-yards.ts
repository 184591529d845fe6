import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'membership_yards',
  `firm_id BIGINT NOT NULL,
   membership_id BIGINT NOT NULL,
   yard_id BIGINT NOT NULL,
   PRIMARY KEY (firm_id, membership_id, yard_id),
   KEY membership_yards_yard (firm_id, yard_id),
   CONSTRAINT membership_yards_membership FOREIGN KEY (firm_id, membership_id) REFERENCES memberships (firm_id, id),
   CONSTRAINT membership_yards_yard FOREIGN KEY (firm_id, yard_id) REFERENCES yards (firm_id, id)`,
);
