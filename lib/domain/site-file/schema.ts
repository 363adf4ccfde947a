import { z } from 'zod';
import { allergens } from '@/lib/domain/site/menu';
import { orderTypes } from '@/lib/domain/site/order-types';
import { ruleKinds } from '@/lib/domain/site/plan';
import { codePages, connections, emphases, printerStages, rollWidthsMm } from '@/lib/domain/site/printer';
import { contactKinds, followModes, sharedPointKinds } from '@/lib/domain/site/site';
import { meshes, stationColours, stationKinds, ticketLayouts } from '@/lib/domain/site/station';
import { addressSources, portKinds, tillKinds, tillSystems } from '@/lib/domain/site/till';

/** The format's own number: a reader refuses one it does not know. */
export const siteFileVersion = 1;

const id = z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'An id has 1 to 36 letters, digits, dots, hyphens or underscores.');
const name = z.string().trim().min(1).max(120);
const words = z.string().max(500).default('');
const address = z.string().max(45).default('');
const version = z.int().min(1).default(1);
const position = z.int().min(0).default(0);
const instant = z.iso.datetime().nullable().default(null);
const ids = z.array(id).max(5_000);

const conditions = z.strictObject({ orderTypes: z.array(z.enum(orderTypes)).default([]), areas: ids.default([]), tills: ids.default([]) });

const target = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('everything') }),
  z.strictObject({ kind: z.literal('section'), section: id }),
  z.strictObject({ kind: z.literal('item'), item: id }),
  z.strictObject({ kind: z.literal('option'), option: id }),
  z.strictObject({ kind: z.literal('option-on-section'), option: id, section: id }),
  z.strictObject({ kind: z.literal('option-on-item'), option: id, item: id }),
]);

const rule = z.strictObject({
  id, kind: z.enum(ruleKinds), target, stations: ids.min(1), keep: z.boolean().default(false),
  conditions: conditions.default({ orderTypes: [], areas: [], tills: [] }),
});

const plan = z.strictObject({
  id, name, position, version, offers: ids.nullable().default(null), rules: z.array(rule).max(5_000),
  weeklyTimes: z.array(z.strictObject({ weekday: z.int().min(1).max(7), start: z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/) })).default([]),
});

const queue = z.strictObject({ printer: id, typedName: z.string().max(220), portKind: z.enum(portKinds), portAddress: z.string().max(255).default(''), testPrintedAt: instant });

const till = z.strictObject({
  id, name, kind: z.enum(tillKinds), area: id, orderTypes: z.array(z.enum(orderTypes)).min(1).default([...orderTypes]),
  system: z.enum(tillSystems).default('other'), address, mask: address, addressSource: z.enum(addressSources).default('static'),
  adapter: words, sharedPoints: ids.default([]), defaultPrinter: id.nullable().default(null), printsThrough: id.nullable().default(null),
  queues: z.array(queue).max(500).default([]), version,
});

const printer = z.strictObject({
  id, name: z.string().max(220), model: words, serial: words, connection: z.enum(connections), hostTill: id.nullable().default(null),
  address, mask: address, gateway: address, port: z.int().min(1).max(65_535).default(9100), mac: z.string().max(40).default(''),
  presentAddress: address, rollWidthMm: z.literal([...rollWidthsMm]).default(80), columns: z.int().min(16).max(96).default(48),
  codePage: z.enum(codePages).default('cp858'), emphasis: z.enum(emphases).default('inverse'), cutter: z.boolean().default(true),
  buzzer: z.boolean().default(false), backup: id.nullable().default(null), joinsStations: z.boolean().default(false),
  sharedPoints: ids.default([]), stage: z.enum(printerStages).default('planned'), downSince: instant, downReason: words, version,
});

const station = z.strictObject({
  id, name, code: z.string().regex(/^[A-Z]{2}$/, 'A code has two capital letters.'), kind: z.enum(stationKinds), mesh: z.enum(meshes), colour: z.enum(stationColours),
  position, printers: ids.default([]), open: z.boolean().default(true), standIn: id.nullable().default(null),
  layout: z.enum(ticketLayouts).default('by-course'), ticketsPerSending: z.int().min(1).max(3).default(1), pace: z.int().min(1).max(1_000).nullable().default(null), version,
});

const allergenList = z.array(z.enum(allergens)).default([]);
const menu = z.strictObject({
  sections: z.array(z.strictObject({ id, name, position, version })).max(2_000),
  items: z.array(z.strictObject({
    id, section: id, name, kitchenName: z.string().max(120).default(''), allergens: allergenList, course: id.nullable().default(null),
    preparationSeconds: z.int().min(0).max(86_400).nullable().default(null), soldOut: z.boolean().default(false), left: z.int().min(0).nullable().default(null),
    noTicket: z.boolean().default(false), optionGroups: ids.default([]), position, version,
  })).max(20_000),
  optionGroups: z.array(z.strictObject({ id, name, min: z.int().min(0).max(99).default(0), max: z.int().min(1).max(99).default(1), options: ids, version })).max(5_000),
  options: z.array(z.strictObject({ id, group: id, name, kitchenName: z.string().max(120).default(''), allergens: allergenList, position, version })).max(20_000),
});

export const siteSchema = z.strictObject({
  id, name, place: z.string().max(120).default(''), timeZone: z.string().max(64), language: z.string().max(35).default('en'), version,
  network: z.strictObject({
    subnet: z.string().max(50).default(''), gateway: address, poolFrom: address, poolTo: address,
    reserved: z.array(z.strictObject({ address: z.string().max(45), reason: z.string().max(200) })).default([]),
  }),
  namingPolicy: z.strictObject({
    minLength: z.int().min(1).max(31), maxLength: z.int().min(1).max(31), allowUnderscore: z.boolean(), allowHyphen: z.boolean(), mustStartWithLetter: z.boolean(),
  }),
  follows: z.enum(followModes).default('by-hand'),
  link: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('none') }),
    z.strictObject({ kind: z.literal('till'), till: id }),
    z.strictObject({ kind: z.literal('own'), address, mask: address }),
  ]).default({ kind: 'none' }),
  contacts: z.array(z.strictObject({ kind: z.enum(contactKinds), name: z.string().max(120), phone: z.string().max(60).default(''), email: z.string().max(254).default('') })).default([]),
  courses: z.array(z.strictObject({ id, name })).default([]),
  sharedPoints: z.array(z.strictObject({ id, name, kind: z.enum(sharedPointKinds) })).default([]),
  areas: z.array(z.strictObject({ id, name, version })).max(500),
  tills: z.array(till).max(500), printers: z.array(printer).max(500), stations: z.array(station).max(200), menu, plans: z.array(plan).max(100),
  live: z.strictObject({ planId: id, version: z.int().min(1), since: z.iso.datetime(), inForceOn: ids }).nullable().default(null),
});

/** One restaurant as one document. */
export const siteFileSchema = z.strictObject({ tamisSiteFile: z.literal(siteFileVersion), site: siteSchema });
export type SiteFile = z.input<typeof siteFileSchema>;

/** JSON Schema 2020-12 of the document, made from the same rules that read it. */
export const siteFileJsonSchema = (): unknown => z.toJSONSchema(siteFileSchema, { io: 'input', target: 'draft-2020-12' });
