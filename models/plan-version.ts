import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { PlanContent } from '@/lib/domain/site/plan';
import { sharedConnection } from './shared-connection';

/** A plan as it stood after one edit; kept for good. */
export class PlanVersionRow extends Model<InferAttributes<PlanVersionRow>, InferCreationAttributes<PlanVersionRow>> {
  declare siteId: string;
  declare planId: string;
  declare number: number;
  declare content: PlanContent;
  declare summary: string;
  declare madeBy: CreationOptional<string | null>;
  declare madeAt: Date;
}

export const definePlanVersionRow = (sequelize: Sequelize): void => {
  PlanVersionRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    planId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    number: { type: DataTypes.INTEGER, primaryKey: true, allowNull: false },
    content: { type: DataTypes.JSON, allowNull: false },
    summary: { type: DataTypes.STRING(500), allowNull: false },
    madeBy: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    madeAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'plan_versions', underscored: true, timestamps: false });
};

definePlanVersionRow(sharedConnection());
