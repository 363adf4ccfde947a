import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** Someone who signs in; what they may do is said per site by a membership. */
export class PersonRow extends Model<InferAttributes<PersonRow>, InferCreationAttributes<PersonRow>> {
  declare id: string;
  declare email: string;
  declare name: string;
  declare passwordHash: string;
  declare sessionVersion: CreationOptional<number>;
  declare createdAt: Date;
}

export const definePersonRow = (sequelize: Sequelize): void => {
  PersonRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    email: { type: DataTypes.STRING(254), allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    passwordHash: { type: DataTypes.STRING(255), allowNull: false },
    sessionVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'people', underscored: true, timestamps: false });
};

definePersonRow(sharedConnection());
