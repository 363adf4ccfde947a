import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { OrderType } from '@/lib/domain/site/order-types';
import { sharedConnection } from './shared-connection';

/** An order type that a till can send. */
export class TillOrderTypeRow extends Model<InferAttributes<TillOrderTypeRow>, InferCreationAttributes<TillOrderTypeRow>> {
  declare siteId: string;
  declare tillId: string;
  declare orderType: OrderType;
}

export const defineTillOrderTypeRow = (sequelize: Sequelize): void => {
  TillOrderTypeRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    tillId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    orderType: { type: DataTypes.STRING(24), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'till_order_types', underscored: true, timestamps: false });
};

defineTillOrderTypeRow(sharedConnection());
