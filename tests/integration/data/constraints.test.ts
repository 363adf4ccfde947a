import { DatabaseError, ForeignKeyConstraintError, QueryTypes, UniqueConstraintError } from 'sequelize';
import { beforeAll, describe, expect, it } from 'vitest';
import { database } from '@/lib/server/database';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeAll(seedDatabase);

/** Tries a statement and takes it back whatever came of it. */
const attempt = async (statement: string): Promise<unknown> => {
  const transaction = await database().transaction();
  try {
    await database().query(statement, { transaction });
    return 'accepted';
  } catch (error) {
    return error;
  } finally {
    await transaction.rollback();
  }
};

const check = (error: unknown): boolean => error instanceof DatabaseError && /CONSTRAINT .* failed/i.test(error.message);

const insertPrinter = (site: string, id: string, name: string): string =>
  `INSERT INTO printers (site_id, id, name, connection, code_page, emphasis, stage) VALUES ('${site}', '${id}', '${name}', 'network', 'cp858', 'inverse', 'planned')`;
const insertStation = (id: string, name: string, code: string): string =>
  `INSERT INTO stations (site_id, id, name, code, kind, mesh, colour, layout) VALUES ('lantern-yard', '${id}', '${name}', '${code}', 'prep', 'rings', 'plum', 'by-course')`;
const insertRule = (kind: string, target: string, columns = '', values = ''): string =>
  `INSERT INTO rules (site_id, id, plan_id, kind, target_kind${columns}) VALUES ('lantern-yard', 'new', 'dinner', '${kind}', '${target}'${values})`;

describe('a reference into another site is refused by the database', () => {
  it.each<readonly [string, string]>([
    ['a till in an area', "UPDATE tills SET area_id = 'shop' WHERE site_id = 'lantern-yard' AND id = 'till-1'"],
    ['a till that prints through a till', "UPDATE tills SET prints_through_id = 'shop-counter' WHERE site_id = 'lantern-yard' AND id = 'till-1'"],
    ['a till with a default printer', "UPDATE tills SET default_printer_id = 'oven1' WHERE site_id = 'lantern-yard' AND id = 'till-1'"],
    ['a printer with a backup', "UPDATE printers SET backup_id = 'oven1' WHERE site_id = 'lantern-yard' AND id = 'grill1'"],
    ['a printer on a till', "UPDATE printers SET host_till_id = 'shop-counter' WHERE site_id = 'lantern-yard' AND id = 'bar2'"],
    ['a station with a printer', "INSERT INTO station_printers (site_id, station_id, position, printer_id) VALUES ('lantern-yard', 'grill', 9, 'oven1')"],
    ['a station with a stand-in', "UPDATE stations SET stand_in_id = 'oven' WHERE site_id = 'lantern-yard' AND id = 'grill'"],
    ['an item in a section', "UPDATE items SET section_id = 'bread' WHERE site_id = 'lantern-yard' AND id = 'house-burger'"],
    ['an item in a course', "UPDATE items SET course_id = 'food' WHERE site_id = 'lantern-yard' AND id = 'house-burger'"],
    ['an item with an option group', "INSERT INTO item_option_groups (site_id, item_id, position, option_group_id) VALUES ('lantern-yard', 'fries', 0, 'bread')"],
    ['a rule about a section', insertRule('send', 'section', ', section_id', ", 'bread'")],
    ['a rule to a station', "INSERT INTO rule_stations (site_id, rule_id, position, station_id) VALUES ('lantern-yard', 'dinner-1', 9, 'oven')"],
    ['a rule for an area', "INSERT INTO rule_areas (site_id, rule_id, area_id) VALUES ('lantern-yard', 'dinner-1', 'shop')"],
    ['a rule for a till', "INSERT INTO rule_tills (site_id, rule_id, till_id) VALUES ('lantern-yard', 'dinner-1', 'shop-counter')"],
    ['a queue for a printer', "INSERT INTO queues (site_id, till_id, printer_id, typed_name, port_kind) VALUES ('lantern-yard', 'till-1', 'oven1', 'OVEN1', 'tcp')"],
    ['a plan put live', "UPDATE sites SET live_plan_id = 'every-day', live_version = 1, live_since = NOW() WHERE id = 'lantern-yard'"],
  ])('%s', async (_what, statement) => {
    expect(await attempt(statement)).toBeInstanceOf(ForeignKeyConstraintError);
  });
});

describe('names that people tell apart by are taken once a site', () => {
  it.each<readonly [string, string]>([
    ['a printer, whatever its case', insertPrinter('lantern-yard', 'new', 'grill1')],
    ['a printer, with a space behind', insertPrinter('lantern-yard', 'new', 'GRILL1 ')],
    ['a station', insertStation('new', 'GRILL', 'XQ')],
    ['a till', "UPDATE tills SET name = 'TILL 2' WHERE site_id = 'lantern-yard' AND id = 'till-1'"],
    ['an area', "UPDATE areas SET name = 'terrace' WHERE site_id = 'lantern-yard' AND id = 'main-room'"],
    ['a menu section', "UPDATE sections SET name = 'OYSTERS' WHERE site_id = 'lantern-yard' AND id = 'fish'"],
    ['an item in its section', "UPDATE items SET name = 'CRÈME BRÛLÉE' WHERE site_id = 'lantern-yard' AND id = 'pavlova'"],
    ['an option in its group', "UPDATE options SET name = 'FRIES' WHERE site_id = 'lantern-yard' AND id = 'burger-side-side-salad'"],
    ['an option group', "UPDATE option_groups SET name = 'steak' WHERE site_id = 'lantern-yard' AND id = 'burger'"],
    ['a plan', "UPDATE plans SET name = 'lunch' WHERE site_id = 'lantern-yard' AND id = 'dinner'"],
    ['a person’s email', "UPDATE people SET email = 'INES@lanternyard.example' WHERE id = 'tomas-brandt'"],
    ['the start of a service', "INSERT INTO weekly_times (site_id, plan_id, weekday, start) VALUES ('lantern-yard', 'lunch', 1, '17:00')"],
  ])('%s', async (_what, statement) => {
    expect(await attempt(statement)).toBeInstanceOf(UniqueConstraintError);
  });

  it.each<readonly [string, string]>([
    ['the same printer name on another site', insertPrinter('pilgrims-oven', 'new', 'GRILL1')],
    ['the same id on another site', insertPrinter('pilgrims-oven', 'grill1', 'GRILL9')],
    ['a name that differs by an accent', "UPDATE items SET name = 'Creme brulee' WHERE site_id = 'lantern-yard' AND id = 'pavlova'"],
    ['the same item in another section', "UPDATE items SET name = 'Fries' WHERE site_id = 'lantern-yard' AND id = 'pavlova'"],
  ])('but not %s', async (_what, statement) => {
    expect(await attempt(statement)).toBe('accepted');
  });
});

describe('what cannot be is refused by the database', () => {
  it.each<readonly [string, string]>([
    ['a code that is no two letters', insertStation('new', 'Fryer', 'F1')],
    ['a code in small letters', insertStation('new', 'Fryer', 'fq')],
    ['a rule about a section that names none', insertRule('send', 'section')],
    ['a rule about everything that names a section', insertRule('send', 'everything', ', section_id', ", 'fish'")],
    ['a split of a whole section', insertRule('split', 'section', ', section_id', ", 'fish'")],
    ['a send rule about an option', insertRule('send', 'option', ', option_id', ", 'burger-side-fries'")],
    ['an order type nobody knows', "INSERT INTO till_order_types (site_id, till_id, order_type) VALUES ('lantern-yard', 'till-1', 'drive-in')"],
    ['a role nobody knows', "UPDATE memberships SET role = 'cook' WHERE site_id = 'lantern-yard'"],
    ['a port beyond the last', "UPDATE printers SET port = 65536 WHERE site_id = 'lantern-yard'"],
    ['four tickets a sending', "UPDATE stations SET tickets_per_sending = 4 WHERE site_id = 'lantern-yard'"],
    ['a printer as its own backup', "UPDATE printers SET backup_id = id WHERE site_id = 'lantern-yard' AND id = 'bar1'"],
    ['a start that is no time', "UPDATE weekly_times SET start = '24:00' WHERE site_id = 'lantern-yard' AND plan_id = 'lunch' AND weekday = 1"],
    ['more options at least than at most', "UPDATE option_groups SET min_count = 2, max_count = 1 WHERE site_id = 'lantern-yard' AND id = 'milk'"],
  ])('%s', async (_what, statement) => {
    expect(await attempt(statement)).toSatisfy(check);
  });

  it.each(['GX', 'XD'])('a code that shares a letter with another in its place: %s', async (code) => {
    expect(await attempt(insertStation('new', 'Fryer', code))).toBeInstanceOf(UniqueConstraintError);
  });
});

describe('what is in use is not deleted', () => {
  it.each<readonly [string, string]>([
    ['a station that a rule sends to', "DELETE FROM stations WHERE site_id = 'lantern-yard' AND id = 'pastry'"],
    ['a section that has items', "DELETE FROM sections WHERE site_id = 'lantern-yard' AND id = 'fish'"],
    ['an item that a rule is about', "DELETE FROM items WHERE site_id = 'lantern-yard' AND id = 'cheese-board'"],
    ['an option that a rule splits', "DELETE FROM options WHERE site_id = 'lantern-yard' AND id = 'burger-side-side-salad'"],
    ['a printer that a station prints on', "DELETE FROM printers WHERE site_id = 'lantern-yard' AND id = 'bar1'"],
    ['a till that a printer is plugged into', "DELETE FROM tills WHERE site_id = 'lantern-yard' AND id = 'terrace'"],
    ['an area with tills in it', "DELETE FROM areas WHERE site_id = 'lantern-yard' AND id = 'terrace'"],
    ['the plan that is live', "DELETE FROM plans WHERE site_id = 'lantern-yard' AND id = 'dinner'"],
  ])('%s', async (_what, statement) => {
    expect(await attempt(statement)).toBeInstanceOf(ForeignKeyConstraintError);
  });

  it('and a plan that is not live goes with its rules, versions and times', async () => {
    const transaction = await database().transaction();
    try {
      await database().query("DELETE FROM plans WHERE site_id = 'lantern-yard' AND id = 'lunch'", { transaction });
      const [left] = await database().query("SELECT (SELECT COUNT(*) FROM rules WHERE plan_id = 'lunch') + (SELECT COUNT(*) FROM plan_versions WHERE plan_id = 'lunch') + (SELECT COUNT(*) FROM weekly_times WHERE plan_id = 'lunch') AS rows_left", { transaction, type: QueryTypes.SELECT });
      expect(left).toEqual({ rows_left: 0 });
    } finally {
      await transaction.rollback();
    }
  });
});

