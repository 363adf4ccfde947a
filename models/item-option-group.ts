import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A group of options that an item comes with. */
export class ItemOptionGroupRow extends Model<InferAttributes<ItemOptionGroupRow>, InferCreationAttributes<ItemOptionGroupRow>> {
  declare siteId: string;
  declare itemId: string;
  declare position: number;
  declare optionGroupId: string;
}

export const defineItemOptionGroupRow = (sequelize: Sequelize): void => {
  ItemOptionGroupRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    itemId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    position: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    optionGroupId: { type: DataTypes.STRING(36), allowNull: false },
  }, { sequelize, tableName: 'item_option_groups', underscored: true, timestamps: false });
};

defineItemOptionGroupRow(sharedConnection());
