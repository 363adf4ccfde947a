import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { SharedPointKind } from '@/lib/domain/site/site';
import { sharedConnection } from './shared-connection';

/** What several devices hang on. */
export class SharedPointRow extends Model<InferAttributes<SharedPointRow>, InferCreationAttributes<SharedPointRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare kind: SharedPointKind;
  declare position: number;
}

export const defineSharedPointRow = (sequelize: Sequelize): void => {
  SharedPointRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
  }, { sequelize, tableName: 'shared_points', underscored: true, timestamps: false });
};

defineSharedPointRow(sharedConnection());
