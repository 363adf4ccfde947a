import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A course that a site names. */
export class CourseRow extends Model<InferAttributes<CourseRow>, InferCreationAttributes<CourseRow>> {
  declare id: string;
  declare siteId: string;
  declare name: string;
  declare position: number;
}

export const defineCourseRow = (sequelize: Sequelize): void => {
  CourseRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(60), allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
  }, { sequelize, tableName: 'courses', underscored: true, timestamps: false });
};

defineCourseRow(sharedConnection());
