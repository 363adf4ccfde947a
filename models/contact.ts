import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { ContactKind } from '@/lib/domain/site/site';
import { sharedConnection } from './shared-connection';

/** Whom to call about one site. */
export class ContactRow extends Model<InferAttributes<ContactRow>, InferCreationAttributes<ContactRow>> {
  declare siteId: string;
  declare position: number;
  declare kind: ContactKind;
  declare name: string;
  declare phone: string;
  declare email: string;
}

export const defineContactRow = (sequelize: Sequelize): void => {
  ContactRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    position: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    phone: { type: DataTypes.STRING(60), allowNull: false },
    email: { type: DataTypes.STRING(254), allowNull: false },
  }, { sequelize, tableName: 'contacts', underscored: true, timestamps: false });
};

defineContactRow(sharedConnection());
