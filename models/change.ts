import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** Who changed what, when, in one sentence. */
export class ChangeRow extends Model<InferAttributes<ChangeRow>, InferCreationAttributes<ChangeRow>> {
  declare id: CreationOptional<number>;
  declare siteId: string;
  declare personId: CreationOptional<string | null>;
  declare at: Date;
  declare action: string;
  declare subjectKind: string;
  declare subjectId: CreationOptional<string | null>;
  declare summary: string;
  declare beforeValue: CreationOptional<object | null>;
  declare afterValue: CreationOptional<object | null>;
}

export const defineChangeRow = (sequelize: Sequelize): void => {
  ChangeRow.init({
    id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), allowNull: false },
    personId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    at: { type: DataTypes.DATE(3), allowNull: false },
    action: { type: DataTypes.STRING(60), allowNull: false },
    subjectKind: { type: DataTypes.STRING(24), allowNull: false },
    subjectId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    summary: { type: DataTypes.STRING(500), allowNull: false },
    beforeValue: { type: DataTypes.JSON, allowNull: true, defaultValue: null },
    afterValue: { type: DataTypes.JSON, allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'changes', underscored: true, timestamps: false });
};

defineChangeRow(sharedConnection());
