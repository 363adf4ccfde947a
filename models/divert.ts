import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Divert } from '@/lib/domain/site/present';
import { sharedConnection } from './shared-connection';

/** A temporary change, with an end or until taken back. */
export class DivertRow extends Model<InferAttributes<DivertRow>, InferCreationAttributes<DivertRow>> {
  declare id: string;
  declare siteId: string;
  declare kind: Divert['kind'];
  declare sectionId: CreationOptional<string | null>;
  declare itemId: CreationOptional<string | null>;
  declare fromStationId: CreationOptional<string | null>;
  declare fromPrinterId: CreationOptional<string | null>;
  declare toPrinterId: CreationOptional<string | null>;
  declare endsAt: CreationOptional<Date | null>;
  declare madeBy: CreationOptional<string | null>;
  declare madeAt: Date;
  declare takenBackAt: CreationOptional<Date | null>;
}

export const defineDivertRow = (sequelize: Sequelize): void => {
  DivertRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    sectionId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    itemId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    fromStationId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    fromPrinterId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    toPrinterId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    endsAt: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
    madeBy: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    madeAt: { type: DataTypes.DATE(3), allowNull: false },
    takenBackAt: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'diverts', underscored: true, timestamps: false });
};

defineDivertRow(sharedConnection());
