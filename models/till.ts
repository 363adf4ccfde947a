import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { AddressSource, TillKind, TillSystem } from '@/lib/domain/site/till';
import { sharedConnection } from './shared-connection';

/** A device that sends orders. */
export class TillRow extends Model<InferAttributes<TillRow>, InferCreationAttributes<TillRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare kind: TillKind;
  declare areaId: string;
  declare system: TillSystem;
  declare address: string;
  declare mask: string;
  declare addressSource: AddressSource;
  declare adapter: string;
  declare defaultPrinterId: CreationOptional<string | null>;
  declare printsThroughId: CreationOptional<string | null>;
  declare position: CreationOptional<number>;
  declare version: CreationOptional<number>;
}

export const defineTillRow = (sequelize: Sequelize): void => {
  TillRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    areaId: { type: DataTypes.STRING(36), allowNull: false },
    system: { type: DataTypes.STRING(24), allowNull: false },
    address: { type: DataTypes.STRING(45), allowNull: false },
    mask: { type: DataTypes.STRING(45), allowNull: false },
    addressSource: { type: DataTypes.STRING(24), allowNull: false },
    adapter: { type: DataTypes.STRING(120), allowNull: false },
    defaultPrinterId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    printsThroughId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    position: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'tills', underscored: true, timestamps: false });
};

defineTillRow(sharedConnection());
