import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** An address that nothing new may take, and why. */
export class ReservedAddressRow extends Model<InferAttributes<ReservedAddressRow>, InferCreationAttributes<ReservedAddressRow>> {
  declare siteId: string;
  declare address: string;
  declare reason: string;
  declare position: number;
}

export const defineReservedAddressRow = (sequelize: Sequelize): void => {
  ReservedAddressRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    address: { type: DataTypes.STRING(45), primaryKey: true, allowNull: false },
    reason: { type: DataTypes.STRING(200), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
  }, { sequelize, tableName: 'reserved_addresses', underscored: true, timestamps: false });
};

defineReservedAddressRow(sharedConnection());
