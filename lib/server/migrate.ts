import { DataTypes, type Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import * as firstTables from '@/migrations/20261201090000-first-tables';
import * as peopleAtTheSameTime from '@/migrations/20261202090000-people-at-the-same-time';

/** Every migration by its file's name, oldest first; a list, so that the build and the bundler see them all. */
const migrations = [
  { name: '20261201090000-first-tables', ...firstTables },
  { name: '20261202090000-people-at-the-same-time', ...peopleAtTheSameTime },
];

const umzugFor = (sequelize: Sequelize) => {
  const queryInterface = sequelize.getQueryInterface();
  return new Umzug({
    migrations: migrations.map(({ name, up, down }) => ({ name, up: async () => up({ queryInterface }), down: async () => down({ queryInterface }) })),
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations_done', columnType: new DataTypes.STRING(120) }),
    logger: undefined,
  });
};

/** Brings a database to the newest shape; the names of what was done. */
export const migrate = async (sequelize: Sequelize): Promise<readonly string[]> => (await umzugFor(sequelize).up()).map(({ name }) => name);

/** Takes every migration back, newest first. */
export const migrateDown = async (sequelize: Sequelize): Promise<readonly string[]> => (await umzugFor(sequelize).down({ to: 0 })).map(({ name }) => name);
