import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A part of the room that orders come from. */
export class AreaRow extends Model<InferAttributes<AreaRow>, InferCreationAttributes<AreaRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare position: CreationOptional<number>;
  declare version: CreationOptional<number>;
}

export const defineAreaRow = (sequelize: Sequelize): void => {
  AreaRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'areas', underscored: true, timestamps: false });
};

defineAreaRow(sharedConnection());
