import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { RuleKind, Target } from '@/lib/domain/site/plan';
import { sharedConnection } from './shared-connection';

/** Target and conditions to stations. */
export class RuleRow extends Model<InferAttributes<RuleRow>, InferCreationAttributes<RuleRow>> {
  declare id: string;
  declare siteId: string;
  declare planId: string;
  declare kind: RuleKind;
  declare targetKind: Target['kind'];
  declare sectionId: CreationOptional<string | null>;
  declare itemId: CreationOptional<string | null>;
  declare optionId: CreationOptional<string | null>;
  declare keep: boolean;
  declare position: number;
}

export const defineRuleRow = (sequelize: Sequelize): void => {
  RuleRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    planId: { type: DataTypes.STRING(36), allowNull: false },
    kind: { type: DataTypes.STRING(24), allowNull: false },
    targetKind: { type: DataTypes.STRING(24), allowNull: false },
    sectionId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    itemId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    optionId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    keep: { type: DataTypes.BOOLEAN, allowNull: false, field: 'keep_on_dish' },
    position: { type: DataTypes.INTEGER, allowNull: false },
  }, { sequelize, tableName: 'rules', underscored: true, timestamps: false });
};

defineRuleRow(sharedConnection());
