import type { MigrationStep } from '../migration';

// A version names its screening and a screening its version, so this key comes after both tables.
export const up: MigrationStep = async ({ context }) => {
  await context.sequelize.query(
    `ALTER TABLE ration_versions
       ADD CONSTRAINT ration_versions_screening FOREIGN KEY IF NOT EXISTS (firm_id, screening_id)
       REFERENCES screenings (firm_id, id)`,
  );
};

export const down: MigrationStep = async ({ context }) => {
  await context.sequelize.query('ALTER TABLE ration_versions DROP FOREIGN KEY IF EXISTS ration_versions_screening');
};
