import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** One sign-in on one device; ended at once by signing out. */
export class SessionRow extends Model<InferAttributes<SessionRow>, InferCreationAttributes<SessionRow>> {
  declare id: string;
  declare personId: string;
  declare createdAt: Date;
  declare endedAt: CreationOptional<Date | null>;
}

export const defineSessionRow = (sequelize: Sequelize): void => {
  SessionRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    personId: { type: DataTypes.STRING(36), allowNull: false },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
    endedAt: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'sessions', underscored: true, timestamps: false });
};

defineSessionRow(sharedConnection());
