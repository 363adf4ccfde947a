import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A printer that a station reads, in the order they are tried. */
export class StationPrinterRow extends Model<InferAttributes<StationPrinterRow>, InferCreationAttributes<StationPrinterRow>> {
  declare siteId: string;
  declare stationId: string;
  declare position: number;
  declare printerId: string;
}

export const defineStationPrinterRow = (sequelize: Sequelize): void => {
  StationPrinterRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    stationId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    position: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    printerId: { type: DataTypes.STRING(36), allowNull: false },
  }, { sequelize, tableName: 'station_printers', underscored: true, timestamps: false });
};

defineStationPrinterRow(sharedConnection());
