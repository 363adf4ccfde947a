import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { OrderType } from '@/lib/domain/site/order-types';
import { sharedConnection } from './shared-connection';

/** An order type that a rule names. */
export class RuleOrderTypeRow extends Model<InferAttributes<RuleOrderTypeRow>, InferCreationAttributes<RuleOrderTypeRow>> {
  declare siteId: string;
  declare ruleId: string;
  declare orderType: OrderType;
}

export const defineRuleOrderTypeRow = (sequelize: Sequelize): void => {
  RuleOrderTypeRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    ruleId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    orderType: { type: DataTypes.STRING(24), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'rule_order_types', underscored: true, timestamps: false });
};

defineRuleOrderTypeRow(sharedConnection());
