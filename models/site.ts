import { DataTypes, Model, type CreationOptional, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import type { FollowMode } from '@/lib/domain/site/site';
import { sharedConnection } from './shared-connection';

/** One restaurant at one address. */
export class SiteRow extends Model<InferAttributes<SiteRow>, InferCreationAttributes<SiteRow>> {
  declare id: string;
  declare name: string;
  declare place: string;
  declare timeZone: string;
  declare language: string;
  declare version: CreationOptional<number>;
  declare revision: CreationOptional<number>;
  declare subnet: string;
  declare gateway: string;
  declare poolFrom: string;
  declare poolTo: string;
  declare nameMinLength: number;
  declare nameMaxLength: number;
  declare nameAllowUnderscore: boolean;
  declare nameAllowHyphen: boolean;
  declare nameMustStartWithLetter: boolean;
  declare follows: FollowMode;
  declare linkKind: 'none' | 'till' | 'own';
  declare linkTillId: CreationOptional<string | null>;
  declare linkAddress: string;
  declare linkMask: string;
  declare livePlanId: CreationOptional<string | null>;
  declare liveVersion: CreationOptional<number | null>;
  declare liveSince: CreationOptional<Date | null>;
}

export const defineSiteRow = (sequelize: Sequelize): void => {
  SiteRow.init({
    id: { type: DataTypes.STRING(36), primaryKey: true, allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: false },
    place: { type: DataTypes.STRING(120), allowNull: false },
    timeZone: { type: DataTypes.STRING(64), allowNull: false },
    language: { type: DataTypes.STRING(35), allowNull: false },
    version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    revision: { type: DataTypes.BIGINT, allowNull: false, defaultValue: 0 },
    subnet: { type: DataTypes.STRING(50), allowNull: false },
    gateway: { type: DataTypes.STRING(45), allowNull: false },
    poolFrom: { type: DataTypes.STRING(45), allowNull: false },
    poolTo: { type: DataTypes.STRING(45), allowNull: false },
    nameMinLength: { type: DataTypes.INTEGER, allowNull: false },
    nameMaxLength: { type: DataTypes.INTEGER, allowNull: false },
    nameAllowUnderscore: { type: DataTypes.BOOLEAN, allowNull: false },
    nameAllowHyphen: { type: DataTypes.BOOLEAN, allowNull: false },
    nameMustStartWithLetter: { type: DataTypes.BOOLEAN, allowNull: false },
    follows: { type: DataTypes.STRING(24), allowNull: false },
    linkKind: { type: DataTypes.STRING(24), allowNull: false },
    linkTillId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    linkAddress: { type: DataTypes.STRING(45), allowNull: false },
    linkMask: { type: DataTypes.STRING(45), allowNull: false },
    livePlanId: { type: DataTypes.STRING(36), allowNull: true, defaultValue: null },
    liveVersion: { type: DataTypes.INTEGER, allowNull: true, defaultValue: null },
    liveSince: { type: DataTypes.DATE(3), allowNull: true, defaultValue: null },
  }, { sequelize, tableName: 'sites', underscored: true, timestamps: false });
};

defineSiteRow(sharedConnection());
