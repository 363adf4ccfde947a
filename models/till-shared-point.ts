import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** What a till hangs on. */
export class TillSharedPointRow extends Model<InferAttributes<TillSharedPointRow>, InferCreationAttributes<TillSharedPointRow>> {
  declare siteId: string;
  declare tillId: string;
  declare sharedPointId: string;
}

export const defineTillSharedPointRow = (sequelize: Sequelize): void => {
  TillSharedPointRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    tillId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    sharedPointId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'till_shared_points', underscored: true, timestamps: false });
};

defineTillSharedPointRow(sharedConnection());
