import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { Allergen } from '@/lib/domain/site/menu';
import { sharedConnection } from './shared-connection';

/** A dish or drink. */
export class ItemRow extends Model<InferAttributes<ItemRow>, InferCreationAttributes<ItemRow>> {
  declare id: string;
  declare siteId: string;
  declare sectionId: string;
  declare name: string;
  declare kitchenName: CreationOptional<string>;
  declare allergens: CreationOptional<Allergen[]>;
  declare courseId: CreationOptional<string | null>;
  declare preparationSeconds: CreationOptional<number | null>;
  declare soldOut: CreationOptional<boolean>;
  declare left: CreationOptional<number | null>;
  declare noTicket: CreationOptional<boolean>;
  declare position: number;
  declare version: CreationOptional<number>;
}

export const defineItemRow = (sequelize: Sequelize): void => {
  ItemRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    sectionId: { type: DataTypes.STRING(36), allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    kitchenName: { type: DataTypes.STRING(120), allowNull: false, defaultValue: '' },
    allergens: { type: DataTypes.JSON, allowNull: false, defaultValue: [] },
    courseId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    preparationSeconds: { type: DataTypes.INTEGER, allowNull: true, defaultValue: null },
    soldOut: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    left: { type: DataTypes.INTEGER, allowNull: true, defaultValue: null, field: 'left_count' },
    noTicket: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'items', underscored: true, timestamps: false });
};

defineItemRow(sharedConnection());
