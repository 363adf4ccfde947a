import { DatabaseError, QueryTypes, type Transaction } from 'sequelize';
import { beforeEach, describe, expect, it, onTestFinished, vi } from 'vitest';
import { database, inTransaction } from '@/lib/server/database';
import { AreaRow } from '@/models/area';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const setPosition = (id: string, position: number, transaction: Transaction) => AreaRow.update({ position }, { where: { siteId: 'lantern-yard', id }, transaction });
const positionOf = async (id: string) => (await AreaRow.findOne({ where: { siteId: 'lantern-yard', id } }))?.position;

/** A point that two sides reach before either goes on. */
const meetingPoint = (sides: number): (() => Promise<void>) => {
  let open: () => void = () => undefined;
  const all = new Promise<void>((resolve) => { open = resolve; });
  let waiting = 0;
  return () => {
    waiting += 1;
    if (waiting === sides) open();
    return all;
  };
};

const killOwnConnections = async (): Promise<void> => {
  const others = await database().query<{ id: number }>('SELECT id FROM information_schema.processlist WHERE db = DATABASE() AND id <> CONNECTION_ID()', { type: QueryTypes.SELECT });
  for (const { id } of others) await database().query(`KILL CONNECTION ${id}`);
};

/** Sequelize warns that it throws a dead connection away, which is what these tests want of it. */
const ignoreWarnings = (): void => {
  const warned = vi.spyOn(console, 'warn').mockReturnValue();
  onTestFinished(() => warned.mockRestore());
};

describe('a unit of work', () => {
  it('is done whole after a deadlock, by both sides', async () => {
    const meet = meetingPoint(2);
    let runs = 0;
    const swap = (first: string, second: string, position: number) => inTransaction(async (transaction) => {
      runs += 1;
      await setPosition(first, position, transaction);
      if (runs <= 2) await meet();
      await setPosition(second, position, transaction);
      return position;
    });
    expect(await Promise.all([swap('main-room', 'terrace', 11), swap('terrace', 'main-room', 22)])).toEqual([11, 22]);
    expect(runs).toBe(3);
    expect(await positionOf('main-room')).toBe(await positionOf('terrace'));
  });

  it('leaves nothing behind when it throws, and is not tried again', async () => {
    let runs = 0;
    await expect(inTransaction(async (transaction) => {
      runs += 1;
      await setPosition('terrace', 99, transaction);
      throw new Error('changed my mind');
    })).rejects.toThrow('changed my mind');
    expect(runs).toBe(1);
    expect(await positionOf('terrace')).toBe(1);
  });

  it('is not tried again when the database refuses it for good', async () => {
    let runs = 0;
    await expect(inTransaction((transaction) => {
      runs += 1;
      return database().query('SELECT nothing FROM nowhere', { transaction });
    })).rejects.toBeInstanceOf(DatabaseError);
    expect(runs).toBe(1);
  });

  it('is tried again when its connection went before anything was committed', async () => {
    ignoreWarnings();
    let runs = 0;
    await inTransaction(async (transaction) => {
      runs += 1;
      const [own] = await database().query<{ id: number }>('SELECT CONNECTION_ID() AS id', { type: QueryTypes.SELECT, transaction });
      if (runs === 1) await database().query(`KILL CONNECTION ${own?.id ?? 0}`);
      await setPosition('terrace', 7, transaction);
    });
    expect(runs).toBe(2);
    expect(await positionOf('terrace')).toBe(7);
  });

  it('finds a pool that has healed when the server closed every connection', async () => {
    ignoreWarnings();
    await Promise.all(Array.from({ length: 4 }, () => AreaRow.count()));
    await killOwnConnections();
    await Promise.all(Array.from({ length: 6 }, (_, index) => inTransaction((transaction) => setPosition('terrace', index, transaction))));
    expect(await AreaRow.count({ where: { siteId: 'lantern-yard' } })).toBe(3);
  });
});
