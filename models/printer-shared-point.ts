import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** What a printer hangs on. */
export class PrinterSharedPointRow extends Model<InferAttributes<PrinterSharedPointRow>, InferCreationAttributes<PrinterSharedPointRow>> {
  declare siteId: string;
  declare printerId: string;
  declare sharedPointId: string;
}

export const definePrinterSharedPointRow = (sequelize: Sequelize): void => {
  PrinterSharedPointRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    printerId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    sharedPointId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'printer_shared_points', underscored: true, timestamps: false });
};

definePrinterSharedPointRow(sharedConnection());
