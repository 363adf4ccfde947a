import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { CodePage, Connection, Emphasis, PrinterStage, RollWidthMm } from '@/lib/domain/site/printer';
import { sharedConnection } from './shared-connection';

/** One ticket printer. */
export class PrinterRow extends Model<InferAttributes<PrinterRow>, InferCreationAttributes<PrinterRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare model: string;
  declare serial: string;
  declare connection: Connection;
  declare hostTillId: CreationOptional<string | null>;
  declare address: string;
  declare mask: string;
  declare gateway: string;
  declare port: number;
  declare mac: string;
  declare presentAddress: string;
  declare rollWidthMm: RollWidthMm;
  declare columns: number;
  declare codePage: CodePage;
  declare emphasis: Emphasis;
  declare cutter: boolean;
  declare buzzer: boolean;
  declare backupId: CreationOptional<string | null>;
  declare joinsStations: boolean;
  declare stage: PrinterStage;
  declare downSince: CreationOptional<Date | null>;
  declare downReason: string;
  declare position: CreationOptional<number>;
  declare version: CreationOptional<number>;
}

export const definePrinterRow = (sequelize: Sequelize): void => {
  PrinterRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(220), allowNull: false },
    model: { type: DataTypes.STRING(120), allowNull: false },
    serial: { type: DataTypes.STRING(120), allowNull: false },
    connection: { type: DataTypes.STRING(24), allowNull: false },
    hostTillId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    address: { type: DataTypes.STRING(45), allowNull: false },
    mask: { type: DataTypes.STRING(45), allowNull: false },
    gateway: { type: DataTypes.STRING(45), allowNull: false },
    port: { type: DataTypes.INTEGER, allowNull: false },
    mac: { type: DataTypes.STRING(40), allowNull: false },
    presentAddress: { type: DataTypes.STRING(45), allowNull: false },
    rollWidthMm: { type: DataTypes.SMALLINT, allowNull: false },
    columns: { type: DataTypes.SMALLINT, allowNull: false, field: 'columns_count' },
    codePage: { type: DataTypes.STRING(24), allowNull: false },
    emphasis: { type: DataTypes.STRING(24), allowNull: false },
    cutter: { type: DataTypes.BOOLEAN, allowNull: false },
    buzzer: { type: DataTypes.BOOLEAN, allowNull: false },
    backupId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    joinsStations: { type: DataTypes.BOOLEAN, allowNull: false },
    stage: { type: DataTypes.STRING(24), allowNull: false },
    downSince: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
    downReason: { type: DataTypes.STRING(500), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'printers', underscored: true, timestamps: false });
};

definePrinterRow(sharedConnection());
