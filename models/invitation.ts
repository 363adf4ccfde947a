import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Role } from '@/lib/domain/roles/permissions';
import { sharedConnection } from './shared-connection';

/** A one-time way in; only a digest of its word is kept. */
export class InvitationRow extends Model<InferAttributes<InvitationRow>, InferCreationAttributes<InvitationRow>> {
  declare id: string;
  declare siteId: string;
  declare email: string;
  declare role: Role;
  declare title: CreationOptional<string>;
  declare mayOverride: CreationOptional<boolean>;
  declare tokenHash: string;
  declare invitedBy: CreationOptional<string | null>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

export const defineInvitationRow = (sequelize: Sequelize): void => {
  InvitationRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    email: { type: DataTypes.STRING(254), allowNull: false },
    role: { type: DataTypes.STRING(24), allowNull: false },
    title: { type: DataTypes.STRING(80), allowNull: false, defaultValue: '' },
    mayOverride: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    tokenHash: { type: DataTypes.STRING(64), allowNull: false },
    invitedBy: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
    usedAt: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'invitations', underscored: true, timestamps: false });
};

defineInvitationRow(sharedConnection());
