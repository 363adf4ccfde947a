import type { QueryInterface } from 'sequelize';

type Place = { readonly queryInterface: QueryInterface };

/** Two owners can change the same person's role, and a sous-chef may be allowed to override before joining. */
export const up = async ({ queryInterface: { sequelize } }: Place): Promise<void> => {
  await sequelize.query('ALTER TABLE memberships ADD COLUMN IF NOT EXISTS version INT NOT NULL DEFAULT 1');
  await sequelize.query('ALTER TABLE invitations ADD COLUMN IF NOT EXISTS may_override TINYINT(1) NOT NULL DEFAULT 0 AFTER title');
};

export const down = async ({ queryInterface: { sequelize } }: Place): Promise<void> => {
  await sequelize.query('ALTER TABLE IF EXISTS memberships DROP COLUMN IF EXISTS version');
  await sequelize.query('ALTER TABLE IF EXISTS invitations DROP COLUMN IF EXISTS may_override');
};
