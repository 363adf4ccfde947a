import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Role } from '@/lib/domain/roles/permissions';
import { sharedConnection } from './shared-connection';

/** The one role a person has on one site. */
export class MembershipRow extends Model<InferAttributes<MembershipRow>, InferCreationAttributes<MembershipRow>> {
  declare siteId: string;
  declare personId: string;
  declare role: Role;
  declare mayOverride: CreationOptional<boolean>;
  declare title: CreationOptional<string>;
  declare version: CreationOptional<number>;
}

export const defineMembershipRow = (sequelize: Sequelize): void => {
  MembershipRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    personId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    role: { type: DataTypes.STRING(24), allowNull: false },
    mayOverride: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    title: { type: DataTypes.STRING(80), allowNull: false, defaultValue: '' },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'memberships', underscored: true, timestamps: false });
};

defineMembershipRow(sharedConnection());
