import type { QueryInterface } from 'sequelize';

/**
 * Ids are opaque ASCII compared byte by byte. Names are compared without case, and accents count: Crème is not Creme.
 * The collation that does so came with MariaDB 10.10; Debian 12 has 10.11.
 */
const id = 'VARCHAR(36) CHARACTER SET ascii COLLATE ascii_bin';
const name = (length: number): string => `VARCHAR(${length}) CHARACTER SET utf8mb4 COLLATE utf8mb4_uca1400_as_ci NOT NULL`;
const text = (length: number): string => `VARCHAR(${length}) NOT NULL DEFAULT ''`;
const flag = (value: 0 | 1): string => `TINYINT(1) NOT NULL DEFAULT ${value}`;
const oneOf = (column: string, values: readonly string[]): string => `VARCHAR(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL CHECK (${column} IN (${values.map((value) => `'${value}'`).join(', ')}))`;
const orderType = ['eat-in', 'take-away', 'delivery'];

/**
 * Every row belongs to a site, and refers within it: the key of another site's row does not fit. Two sites may use the
 * same id, so that a copy of a site keeps its ids.
 */
const ofSite = `site_id ${id} NOT NULL`;
const key = 'PRIMARY KEY (site_id, id), FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE CASCADE';
const to = (column: string, table: string, onDelete = ''): string => `FOREIGN KEY (site_id, ${column}) REFERENCES ${table} (site_id, id) ${onDelete}`;
const cascade = 'ON DELETE CASCADE';

/** A rule has the parts that its target names, and no others; each kind has its own targets. */
const targetChecks = [
  "CHECK ((section_id IS NOT NULL) = (target_kind IN ('section', 'option-on-section')))",
  "CHECK ((item_id IS NOT NULL) = (target_kind IN ('item', 'option-on-item')))",
  "CHECK ((option_id IS NOT NULL) = (target_kind IN ('option', 'option-on-section', 'option-on-item')))",
  "CHECK (kind = 'split' AND option_id IS NOT NULL OR kind = 'send' AND option_id IS NULL OR kind = 'copy' AND target_kind IN ('everything', 'section', 'item', 'option'))",
];

const tables: readonly (readonly [string, readonly string[]])[] = [
  ['people', [`id ${id} NOT NULL PRIMARY KEY`, `email ${name(254)} UNIQUE`, `name ${name(120)}`, 'password_hash VARCHAR(255) NOT NULL', 'session_version INT NOT NULL DEFAULT 1', 'created_at DATETIME(3) NOT NULL']],
  ['sessions', [`id ${id} NOT NULL PRIMARY KEY`, `person_id ${id} NOT NULL`, 'created_at DATETIME(3) NOT NULL', 'ended_at DATETIME(3)', 'FOREIGN KEY (person_id) REFERENCES people (id) ON DELETE CASCADE']],
  ['sites', [
    `id ${id} NOT NULL PRIMARY KEY`, `name ${name(120)}`, `place ${text(120)}`, `time_zone ${text(64)}`, `language ${text(35)}`, 'version INT NOT NULL DEFAULT 1', 'revision BIGINT NOT NULL DEFAULT 0',
    `subnet ${text(50)}`, `gateway ${text(45)}`, `pool_from ${text(45)}`, `pool_to ${text(45)}`,
    'name_min_length TINYINT NOT NULL DEFAULT 2', 'name_max_length TINYINT NOT NULL DEFAULT 12', `name_allow_underscore ${flag(1)}`, `name_allow_hyphen ${flag(1)}`, `name_must_start_with_letter ${flag(1)}`,
    `follows ${oneOf('follows', ['by-hand', 'asking', 'through-link'])}`, `link_kind ${oneOf('link_kind', ['none', 'till', 'own'])}`, `link_till_id ${id}`, `link_address ${text(45)}`, `link_mask ${text(45)}`,
    `live_plan_id ${id}`, 'live_version INT', 'live_since DATETIME(3)',
  ]],
  ['memberships', [
    `person_id ${id} NOT NULL`, ofSite, `role ${oneOf('role', ['owner', 'chef', 'installer', 'trainer'])}`, `may_override ${flag(0)}`, `title ${text(80)}`,
    'PRIMARY KEY (site_id, person_id)', 'FOREIGN KEY (person_id) REFERENCES people (id) ON DELETE CASCADE', 'FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE CASCADE',
  ]],
  ['invitations', [
    `id ${id} NOT NULL`, ofSite, 'email VARCHAR(254) NOT NULL', `role ${oneOf('role', ['owner', 'chef', 'installer', 'trainer'])}`, `title ${text(80)}`, 'token_hash CHAR(64) CHARACTER SET ascii NOT NULL UNIQUE',
    `invited_by ${id}`, 'expires_at DATETIME(3) NOT NULL', 'used_at DATETIME(3)', key, 'FOREIGN KEY (invited_by) REFERENCES people (id) ON DELETE SET NULL',
  ]],
  ['reserved_addresses', [ofSite, 'address VARCHAR(45) NOT NULL', `reason ${text(200)}`, 'position INT NOT NULL DEFAULT 0', 'PRIMARY KEY (site_id, address)', 'FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE CASCADE']],
  ['contacts', [ofSite, `kind ${oneOf('kind', ['installer', 'network', 'electrician'])}`, 'position INT NOT NULL', `name ${text(120)}`, `phone ${text(60)}`, `email ${text(254)}`, 'PRIMARY KEY (site_id, position)', 'FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE CASCADE']],
  ['courses', [`id ${id} NOT NULL`, ofSite, `name ${name(60)}`, 'position INT NOT NULL DEFAULT 0', key, 'UNIQUE KEY name (site_id, name)']],
  ['shared_points', [`id ${id} NOT NULL`, ofSite, `name ${name(120)}`, `kind ${oneOf('kind', ['switch', 'access-point', 'power-strip', 'other'])}`, 'position INT NOT NULL DEFAULT 0', key, 'UNIQUE KEY name (site_id, name)']],
  ['areas', [`id ${id} NOT NULL`, ofSite, `name ${name(120)}`, 'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)']],
  ['tills', [
    `id ${id} NOT NULL`, ofSite, `name ${name(120)}`, `kind ${oneOf('kind', ['fixed', 'handheld', 'online'])}`, `area_id ${id} NOT NULL`, `system ${oneOf('system', ['windows', 'linux', 'other'])}`,
    `address ${text(45)}`, `mask ${text(45)}`, `address_source ${oneOf('address_source', ['static', 'dhcp', 'dhcp-reserved'])}`, `adapter ${text(120)}`, `default_printer_id ${id}`, `prints_through_id ${id}`,
    'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)', to('area_id', 'areas'), to('prints_through_id', 'tills'),
  ]],
  ['till_order_types', [ofSite, `till_id ${id} NOT NULL`, `order_type ${oneOf('order_type', orderType)}`, 'PRIMARY KEY (site_id, till_id, order_type)', to('till_id', 'tills', cascade)]],
  ['till_shared_points', [ofSite, `till_id ${id} NOT NULL`, `shared_point_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, till_id, shared_point_id)', to('till_id', 'tills', cascade), to('shared_point_id', 'shared_points', cascade)]],
  ['printers', [
    `id ${id} NOT NULL`, ofSite, `name ${name(220)}`, `model ${text(120)}`, `serial ${text(120)}`, `connection ${oneOf('connection', ['network', 'usb', 'serial', 'parallel'])}`, `host_till_id ${id}`,
    `address ${text(45)}`, `mask ${text(45)}`, `gateway ${text(45)}`, 'port INT NOT NULL DEFAULT 9100 CHECK (port BETWEEN 1 AND 65535)', `mac ${text(40)}`, `present_address ${text(45)}`,
    'roll_width_mm SMALLINT NOT NULL DEFAULT 80 CHECK (roll_width_mm IN (80, 76, 58))', 'columns_count SMALLINT NOT NULL DEFAULT 48 CHECK (columns_count BETWEEN 16 AND 96)',
    `code_page ${oneOf('code_page', ['cp437', 'cp850', 'cp852', 'cp858', 'cp866', 'windows-1252'])}`, `emphasis ${oneOf('emphasis', ['inverse', 'red', 'frame'])}`, `cutter ${flag(1)}`, `buzzer ${flag(0)}`,
    `backup_id ${id}`, `joins_stations ${flag(0)}`, `stage ${oneOf('stage', ['planned', 'addressed', 'reachable', 'tested', 'signed-off'])}`, 'down_since DATETIME(3)', `down_reason ${text(500)}`,
    'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)', to('host_till_id', 'tills'), to('backup_id', 'printers'), 'CHECK (backup_id IS NULL OR backup_id <> id)',
  ]],
  ['printer_shared_points', [ofSite, `printer_id ${id} NOT NULL`, `shared_point_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, printer_id, shared_point_id)', to('printer_id', 'printers', cascade), to('shared_point_id', 'shared_points', cascade)]],
  ['queues', [
    ofSite, `till_id ${id} NOT NULL`, `printer_id ${id} NOT NULL`, 'typed_name VARCHAR(220) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL', `port_kind ${oneOf('port_kind', ['tcp', 'usb', 'parallel', 'shared'])}`, `port_address ${text(255)}`, 'test_printed_at DATETIME(3)',
    'PRIMARY KEY (site_id, till_id, printer_id)', to('till_id', 'tills', cascade), to('printer_id', 'printers', cascade),
  ]],
  ['stations', [
    `id ${id} NOT NULL`, ofSite, `name ${name(60)}`, "code VARCHAR(2) CHARACTER SET ascii COLLATE ascii_bin NOT NULL CHECK (code RLIKE '^[A-Z][A-Z]$')", "first_letter VARCHAR(1) CHARACTER SET ascii AS (SUBSTR(code, 1, 1)) STORED", "second_letter VARCHAR(1) CHARACTER SET ascii AS (SUBSTR(code, 2, 1)) STORED",
    `kind ${oneOf('kind', ['prep', 'pass'])}`, 'mesh VARCHAR(24) NOT NULL', 'colour VARCHAR(24) NOT NULL', 'position INT NOT NULL DEFAULT 0', `open ${flag(1)}`, `stand_in_id ${id}`, `layout ${oneOf('layout', ['by-course', 'by-seat'])}`,
    'tickets_per_sending TINYINT NOT NULL DEFAULT 1 CHECK (tickets_per_sending BETWEEN 1 AND 3)', 'pace INT', 'version INT NOT NULL DEFAULT 1', key,
    'UNIQUE KEY name (site_id, name)', 'UNIQUE KEY first_letter (site_id, first_letter)', 'UNIQUE KEY second_letter (site_id, second_letter)', to('stand_in_id', 'stations'), 'CHECK (stand_in_id IS NULL OR stand_in_id <> id)',
  ]],
  ['station_printers', [ofSite, `station_id ${id} NOT NULL`, 'position INT NOT NULL', `printer_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, station_id, position)', 'UNIQUE KEY once (site_id, station_id, printer_id)', to('station_id', 'stations', cascade), to('printer_id', 'printers')]],
  ['sections', [`id ${id} NOT NULL`, ofSite, `name ${name(120)}`, 'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)']],
  ['items', [
    `id ${id} NOT NULL`, ofSite, `section_id ${id} NOT NULL`, `name ${name(120)}`, `kitchen_name ${text(120)}`, "allergens JSON NOT NULL DEFAULT '[]'", `course_id ${id}`, 'preparation_seconds INT CHECK (preparation_seconds >= 0)', `sold_out ${flag(0)}`, 'left_count INT CHECK (left_count >= 0)', `no_ticket ${flag(0)}`,
    'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, section_id, name)', to('section_id', 'sections'), to('course_id', 'courses'),
  ]],
  ['option_groups', [`id ${id} NOT NULL`, ofSite, `name ${name(120)}`, 'min_count INT NOT NULL DEFAULT 0', 'max_count INT NOT NULL DEFAULT 1', 'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)', 'CHECK (min_count >= 0 AND max_count >= 1 AND max_count >= min_count)']],
  ['options', [`id ${id} NOT NULL`, ofSite, `option_group_id ${id} NOT NULL`, `name ${name(120)}`, `kitchen_name ${text(120)}`, "allergens JSON NOT NULL DEFAULT '[]'", 'position INT NOT NULL DEFAULT 0', 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, option_group_id, name)', to('option_group_id', 'option_groups', cascade)]],
  ['item_option_groups', [ofSite, `item_id ${id} NOT NULL`, 'position INT NOT NULL', `option_group_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, item_id, position)', 'UNIQUE KEY once (site_id, item_id, option_group_id)', to('item_id', 'items', cascade), to('option_group_id', 'option_groups')]],
  ['plans', [`id ${id} NOT NULL`, ofSite, `name ${name(60)}`, 'position INT NOT NULL DEFAULT 0', `offers_all ${flag(1)}`, 'version INT NOT NULL DEFAULT 1', key, 'UNIQUE KEY name (site_id, name)']],
  ['plan_sections', [ofSite, `plan_id ${id} NOT NULL`, `section_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, plan_id, section_id)', to('plan_id', 'plans', cascade), to('section_id', 'sections', cascade)]],
  ['weekly_times', [ofSite, `plan_id ${id} NOT NULL`, 'weekday TINYINT NOT NULL CHECK (weekday BETWEEN 1 AND 7)', "start CHAR(5) CHARACTER SET ascii NOT NULL CHECK (start RLIKE '^([01][0-9]|2[0-3]):[0-5][0-9]$')", 'PRIMARY KEY (site_id, weekday, start)', to('plan_id', 'plans', cascade)]],
  ['rules', [
    `id ${id} NOT NULL`, ofSite, `plan_id ${id} NOT NULL`, `kind ${oneOf('kind', ['send', 'split', 'copy'])}`, `target_kind ${oneOf('target_kind', ['everything', 'section', 'item', 'option', 'option-on-section', 'option-on-item'])}`,
    `section_id ${id}`, `item_id ${id}`, `option_id ${id}`, `keep_on_dish ${flag(0)}`, 'position INT NOT NULL DEFAULT 0', key, to('plan_id', 'plans', cascade), to('section_id', 'sections'), to('item_id', 'items'), to('option_id', 'options'),
    ...targetChecks,
  ]],
  ['rule_stations', [ofSite, `rule_id ${id} NOT NULL`, 'position INT NOT NULL', `station_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, rule_id, position)', to('rule_id', 'rules', cascade), to('station_id', 'stations')]],
  ['rule_order_types', [ofSite, `rule_id ${id} NOT NULL`, `order_type ${oneOf('order_type', orderType)}`, 'PRIMARY KEY (site_id, rule_id, order_type)', to('rule_id', 'rules', cascade)]],
  ['rule_areas', [ofSite, `rule_id ${id} NOT NULL`, `area_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, rule_id, area_id)', to('rule_id', 'rules', cascade), to('area_id', 'areas')]],
  ['rule_tills', [ofSite, `rule_id ${id} NOT NULL`, `till_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, rule_id, till_id)', to('rule_id', 'rules', cascade), to('till_id', 'tills')]],
  ['plan_versions', [ofSite, `plan_id ${id} NOT NULL`, 'number INT NOT NULL', 'content JSON NOT NULL', `summary ${text(500)}`, `made_by ${id}`, 'made_at DATETIME(3) NOT NULL', 'PRIMARY KEY (site_id, plan_id, number)', to('plan_id', 'plans', cascade), 'FOREIGN KEY (made_by) REFERENCES people (id) ON DELETE SET NULL']],
  ['live_tills', [ofSite, `till_id ${id} NOT NULL`, `plan_id ${id} NOT NULL`, 'version INT NOT NULL', 'since DATETIME(3) NOT NULL', `said_by ${id}`, 'PRIMARY KEY (site_id, till_id)', to('till_id', 'tills', cascade), 'FOREIGN KEY (site_id, plan_id, version) REFERENCES plan_versions (site_id, plan_id, number) ON DELETE CASCADE', 'FOREIGN KEY (said_by) REFERENCES people (id) ON DELETE SET NULL']],
  ['diverts', [
    `id ${id} NOT NULL`, ofSite, `kind ${oneOf('kind', ['section', 'item', 'station', 'printer'])}`, `section_id ${id}`, `item_id ${id}`, `from_station_id ${id}`, `from_printer_id ${id}`, `to_printer_id ${id}`, 'ends_at DATETIME(3)', `made_by ${id}`, 'made_at DATETIME(3) NOT NULL', 'taken_back_at DATETIME(3)', key,
    to('section_id', 'sections', cascade), to('item_id', 'items', cascade), to('from_station_id', 'stations', cascade), to('from_printer_id', 'printers', cascade), to('to_printer_id', 'printers', cascade), 'FOREIGN KEY (made_by) REFERENCES people (id) ON DELETE SET NULL',
  ]],
  ['divert_stations', [ofSite, `divert_id ${id} NOT NULL`, 'position INT NOT NULL', `station_id ${id} NOT NULL`, 'PRIMARY KEY (site_id, divert_id, position)', to('divert_id', 'diverts', cascade), to('station_id', 'stations', cascade)]],
  ['changes', [
    'id BIGINT NOT NULL AUTO_INCREMENT PRIMARY KEY', ofSite, `person_id ${id}`, 'at DATETIME(3) NOT NULL', 'action VARCHAR(60) NOT NULL', 'subject_kind VARCHAR(24) NOT NULL', `subject_id ${id}`, 'summary VARCHAR(500) NOT NULL', 'before_value JSON', 'after_value JSON',
    'KEY by_subject (site_id, subject_kind, subject_id, id)', 'KEY by_time (site_id, id)', 'FOREIGN KEY (site_id) REFERENCES sites (id) ON DELETE CASCADE', 'FOREIGN KEY (person_id) REFERENCES people (id) ON DELETE SET NULL',
  ]],
];

/** References that could not be made before their table existed. */
const lateKeys: readonly string[] = [
  'ALTER TABLE sites ADD CONSTRAINT sites_link_till FOREIGN KEY IF NOT EXISTS (id, link_till_id) REFERENCES tills (site_id, id)',
  'ALTER TABLE sites ADD CONSTRAINT sites_live_plan FOREIGN KEY IF NOT EXISTS (id, live_plan_id, live_version) REFERENCES plan_versions (site_id, plan_id, number)',
  'ALTER TABLE tills ADD CONSTRAINT tills_default_printer FOREIGN KEY IF NOT EXISTS (site_id, default_printer_id) REFERENCES printers (site_id, id)',
];

type Place = { readonly queryInterface: QueryInterface };

/** MariaDB ends a transaction at each of these statements, so that a cut-off run is simply run again. */
export const up = async ({ queryInterface: { sequelize } }: Place): Promise<void> => {
  for (const [table, columns] of tables) {
    await sequelize.query(`CREATE TABLE IF NOT EXISTS ${table} (\n  ${columns.join(',\n  ')}\n) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci`);
  }
  for (const statement of lateKeys) await sequelize.query(statement);
};

export const down = async ({ queryInterface: { sequelize } }: Place): Promise<void> => {
  await sequelize.query('ALTER TABLE IF EXISTS sites DROP FOREIGN KEY IF EXISTS sites_link_till, DROP FOREIGN KEY IF EXISTS sites_live_plan');
  await sequelize.query('ALTER TABLE IF EXISTS tills DROP FOREIGN KEY IF EXISTS tills_default_printer');
  for (const [table] of tables.toReversed()) await sequelize.query(`DROP TABLE IF EXISTS ${table}`);
};
