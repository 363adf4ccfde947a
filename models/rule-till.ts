import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A till that a rule names. */
export class RuleTillRow extends Model<InferAttributes<RuleTillRow>, InferCreationAttributes<RuleTillRow>> {
  declare siteId: string;
  declare ruleId: string;
  declare tillId: string;
}

export const defineRuleTillRow = (sequelize: Sequelize): void => {
  RuleTillRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    ruleId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    tillId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'rule_tills', underscored: true, timestamps: false });
};

defineRuleTillRow(sharedConnection());
