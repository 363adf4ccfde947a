import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Allergen } from '@/lib/domain/site/menu';
import { sharedConnection } from './shared-connection';

/** A choice on an item. */
export class OptionRow extends Model<InferAttributes<OptionRow>, InferCreationAttributes<OptionRow>> {
  declare id: string;
  declare siteId: string;
  declare optionGroupId: string;
  declare name: string;
  declare kitchenName: CreationOptional<string>;
  declare allergens: CreationOptional<Allergen[]>;
  declare position: number;
  declare version: CreationOptional<number>;
}

export const defineOptionRow = (sequelize: Sequelize): void => {
  OptionRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    optionGroupId: { type: DataTypes.STRING(36), allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    kitchenName: { type: DataTypes.STRING(120), allowNull: false, defaultValue: '' },
    allergens: { type: DataTypes.JSON, allowNull: false, defaultValue: [] },
    position: { type: DataTypes.INTEGER, allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'options', underscored: true, timestamps: false });
};

defineOptionRow(sharedConnection());
