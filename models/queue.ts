import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { PortKind } from '@/lib/domain/site/till';
import { sharedConnection } from './shared-connection';

/** One printer as it is installed on one till. */
export class QueueRow extends Model<InferAttributes<QueueRow>, InferCreationAttributes<QueueRow>> {
  declare siteId: string;
  declare tillId: string;
  declare printerId: string;
  declare typedName: string;
  declare portKind: PortKind;
  declare portAddress: string;
  declare testPrintedAt: CreationOptional<Date | null>;
}

export const defineQueueRow = (sequelize: Sequelize): void => {
  QueueRow.init({
    siteId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    tillId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    printerId: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    typedName: { type: DataTypes.STRING(220), allowNull: false },
    portKind: { type: DataTypes.STRING(24), allowNull: false },
    portAddress: { type: DataTypes.STRING(255), allowNull: false },
    testPrintedAt: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'queues', underscored: true, timestamps: false });
};

defineQueueRow(sharedConnection());
