import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Mesh, StationColour, StationKind, TicketLayout } from '@/lib/domain/site/station';
import { sharedConnection } from './shared-connection';

/** Where work is done, or checked and sent out. */
export class StationRow extends Model<InferAttributes<StationRow>, InferCreationAttributes<StationRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare code: string;
  declare kind: StationKind;
  declare mesh: Mesh;
  declare colour: StationColour;
  declare position: number;
  declare open: boolean;
  declare standInId: CreationOptional<string | null>;
  declare layout: TicketLayout;
  declare ticketsPerSending: number;
  declare pace: CreationOptional<number | null>;
  declare version: CreationOptional<number>;
}

export const defineStationRow = (sequelize: Sequelize): void => {
  StationRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(60), allowNull: false },
    code: { type: DataTypes.STRING(2), allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    mesh: { type: DataTypes.STRING(24), allowNull: false },
    colour: { type: DataTypes.STRING(24), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    open: { type: DataTypes.BOOLEAN, allowNull: false },
    standInId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    layout: { type: DataTypes.STRING(24), allowNull: false },
    ticketsPerSending: { type: DataTypes.INTEGER, allowNull: false },
    pace: { type: DataTypes.INTEGER, allowNull: true, defaultValue: null },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'stations', underscored: true, timestamps: false });
};

defineStationRow(sharedConnection());
