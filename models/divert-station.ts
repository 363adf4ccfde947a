import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** Where a divert leads. */
export class DivertStationRow extends Model<InferAttributes<DivertStationRow>, InferCreationAttributes<DivertStationRow>> {
  declare siteId: string;
  declare divertId: string;
  declare position: number;
  declare stationId: string;
}

export const defineDivertStationRow = (sequelize: Sequelize): void => {
  DivertStationRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    divertId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    position: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    stationId: { type: DataTypes.STRING(36), allowNull: false },
  }, { sequelize, tableName: 'divert_stations', underscored: true, timestamps: false });
};

defineDivertStationRow(sharedConnection());
