import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** One complete set of rules, made for one service. */
export class PlanRow extends Model<InferAttributes<PlanRow>, InferCreationAttributes<PlanRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare position: number;
  declare offersAll: CreationOptional<boolean>;
  declare version: CreationOptional<number>;
}

export const definePlanRow = (sequelize: Sequelize): void => {
  PlanRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(60), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    offersAll: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
  }, { sequelize, tableName: 'plans', underscored: true, timestamps: false });
};

definePlanRow(sharedConnection());
