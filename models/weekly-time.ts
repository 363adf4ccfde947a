import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** When a service starts, every week, on the site’s own clock. */
export class WeeklyTimeRow extends Model<InferAttributes<WeeklyTimeRow>, InferCreationAttributes<WeeklyTimeRow>> {
  declare siteId: string;
  declare planId: string;
  declare weekday: number;
  declare start: string;
}

export const defineWeeklyTimeRow = (sequelize: Sequelize): void => {
  WeeklyTimeRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    planId: { type: DataTypes.STRING(36), allowNull: false },
    weekday: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    start: { type: DataTypes.STRING(5), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'weekly_times', underscored: true, timestamps: false });
};

defineWeeklyTimeRow(sharedConnection());
