import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** Choices that belong together. */
export class OptionGroupRow extends Model<InferAttributes<OptionGroupRow>, InferCreationAttributes<OptionGroupRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare min: number;
  declare max: number;
  declare position: number;
  declare version: CreationOptional<number>;
}

export const defineOptionGroupRow = (sequelize: Sequelize): void => {
  OptionGroupRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    min: { type: DataTypes.INTEGER, allowNull: false, field: 'min_count' },
    max: { type: DataTypes.INTEGER, allowNull: false, field: 'max_count' },
    position: { type: DataTypes.INTEGER, allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'option_groups', underscored: true, timestamps: false });
};

defineOptionGroupRow(sharedConnection());
