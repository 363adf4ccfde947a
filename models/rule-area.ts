import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** An area that a rule names. */
export class RuleAreaRow extends Model<InferAttributes<RuleAreaRow>, InferCreationAttributes<RuleAreaRow>> {
  declare siteId: string;
  declare ruleId: string;
  declare areaId: string;
}

export const defineRuleAreaRow = (sequelize: Sequelize): void => {
  RuleAreaRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    ruleId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    areaId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'rule_areas', underscored: true, timestamps: false });
};

defineRuleAreaRow(sharedConnection());
