import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A station that a rule sends to. */
export class RuleStationRow extends Model<InferAttributes<RuleStationRow>, InferCreationAttributes<RuleStationRow>> {
  declare siteId: string;
  declare ruleId: string;
  declare position: number;
  declare stationId: string;
}

export const defineRuleStationRow = (sequelize: Sequelize): void => {
  RuleStationRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    ruleId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    position: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    stationId: { type: DataTypes.STRING(36), allowNull: false },
  }, { sequelize, tableName: 'rule_stations', underscored: true, timestamps: false });
};

defineRuleStationRow(sharedConnection());
