import { tableMigration } from '../migration';

export const { up, down } = tableMigration(
  'throttle_counts',
  `throttle_key CHAR(64) NOT NULL PRIMARY KEY,
   hits INT NOT NULL,
   expires_at DATETIME(3) NOT NULL,
   KEY throttle_counts_expires (expires_at)`,
);
