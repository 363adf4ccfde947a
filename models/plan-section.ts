import { DataTypes, Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { sharedConnection } from './shared-connection';

/** A section that a plan offers, when it does not offer all. */
export class PlanSectionRow extends Model<InferAttributes<PlanSectionRow>, InferCreationAttributes<PlanSectionRow>> {
  declare siteId: string;
  declare planId: string;
  declare sectionId: string;
}

export const definePlanSectionRow = (sequelize: Sequelize): void => {
  PlanSectionRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    planId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    sectionId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
  }, { sequelize, tableName: 'plan_sections', underscored: true, timestamps: false });
};

definePlanSectionRow(sharedConnection());
