import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** The plan version that a till was last set to. */
export class LiveTillRow extends Model<InferAttributes<LiveTillRow>, InferCreationAttributes<LiveTillRow>> {
  declare siteId: string;
  declare tillId: string;
  declare planId: string;
  declare version: number;
  declare since: Date;
  declare saidBy: CreationOptional<string | null>;
}

export const defineLiveTillRow = (sequelize: Sequelize): void => {
  LiveTillRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    tillId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    planId: { type: DataTypes.STRING(36), allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false },
    since: { type: DataTypes.DATE(3), allowNull: false },
    saidBy: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'live_tills', underscored: true, timestamps: false });
};

defineLiveTillRow(sharedConnection());
