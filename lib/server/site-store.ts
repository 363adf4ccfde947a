import 'server-only';
import type { Transaction } from 'sequelize';
import type { Plan, PlanContent } from '@/lib/domain/site/plan';
import type { Site } from '@/lib/domain/site/site';
import { AreaRow } from '@/models/area';
import { ContactRow } from '@/models/contact';
import { CourseRow } from '@/models/course';
import { ItemRow } from '@/models/item';
import { ItemOptionGroupRow } from '@/models/item-option-group';
import { OptionRow } from '@/models/option';
import { OptionGroupRow } from '@/models/option-group';
import { PlanRow } from '@/models/plan';
import { PlanVersionRow } from '@/models/plan-version';
import { PrinterRow } from '@/models/printer';
import { PrinterSharedPointRow } from '@/models/printer-shared-point';
import { QueueRow } from '@/models/queue';
import { ReservedAddressRow } from '@/models/reserved-address';
import { SectionRow } from '@/models/section';
import { SharedPointRow } from '@/models/shared-point';
import { SiteRow } from '@/models/site';
import { StationRow } from '@/models/station';
import { StationPrinterRow } from '@/models/station-printer';
import { TillRow } from '@/models/till';
import { TillOrderTypeRow } from '@/models/till-order-type';
import { TillSharedPointRow } from '@/models/till-shared-point';
import { WeeklyTimeRow } from '@/models/weekly-time';
import { replacePlanContent } from './plan-store';

const dateOrNull = (instant: string | null): Date | null => (instant === null ? null : new Date(instant));

const insertSurroundings = async (transaction: Transaction, site: Site): Promise<void> => {
  const siteId = site.id;
  await AreaRow.bulkCreate(site.areas.map(({ id, name }, position) => ({ id, siteId, name, position })), { transaction });
  await CourseRow.bulkCreate(site.courses.map(({ id, name }, position) => ({ id, siteId, name, position })), { transaction });
  await SharedPointRow.bulkCreate(site.sharedPoints.map((point, position) => ({ ...point, siteId, position })), { transaction });
  await ContactRow.bulkCreate(site.contacts.map((contact, position) => ({ ...contact, siteId, position })), { transaction });
  await ReservedAddressRow.bulkCreate(site.network.reserved.map((reserved, position) => ({ ...reserved, siteId, position })), { transaction });
};

/** Tills and printers refer to each other, so that references are set once both are there. */
const insertDevices = async (transaction: Transaction, site: Site): Promise<void> => {
  const siteId = site.id;
  await TillRow.bulkCreate(site.tills.map((till, position) => ({
    id: till.id, siteId, name: till.name, kind: till.kind, areaId: till.area, system: till.system, address: till.address, mask: till.mask,
    addressSource: till.addressSource, adapter: till.adapter, position,
  })), { transaction });
  await PrinterRow.bulkCreate(site.printers.map((printer, position) => {
    const { hostTill, backup, sharedPoints: _points, downSince, version: _version, ...fields } = printer;
    return { ...fields, siteId, hostTillId: hostTill, backupId: null, downSince: dateOrNull(downSince), position };
  }), { transaction });
  for (const till of site.tills) {
    await TillRow.update({ defaultPrinterId: till.defaultPrinter, printsThroughId: till.printsThrough }, { where: { siteId, id: till.id }, transaction });
  }
  for (const printer of site.printers) {
    if (printer.backup !== null) await PrinterRow.update({ backupId: printer.backup }, { where: { siteId, id: printer.id }, transaction });
  }
  await TillOrderTypeRow.bulkCreate(site.tills.flatMap((till) => till.orderTypes.map((orderType) => ({ siteId, tillId: till.id, orderType }))), { transaction });
  await TillSharedPointRow.bulkCreate(site.tills.flatMap((till) => till.sharedPoints.map((sharedPointId) => ({ siteId, tillId: till.id, sharedPointId }))), { transaction });
  await PrinterSharedPointRow.bulkCreate(site.printers.flatMap((printer) => printer.sharedPoints.map((sharedPointId) => ({ siteId, printerId: printer.id, sharedPointId }))), { transaction });
  await QueueRow.bulkCreate(site.tills.flatMap((till) => till.queues.map((queue) => ({
    siteId, tillId: till.id, printerId: queue.printer, typedName: queue.typedName, portKind: queue.portKind, portAddress: queue.portAddress, testPrintedAt: dateOrNull(queue.testPrintedAt),
  }))), { transaction });
};

const insertStations = async (transaction: Transaction, site: Site): Promise<void> => {
  const siteId = site.id;
  await StationRow.bulkCreate(site.stations.map(({ printers: _printers, standIn: _standIn, version: _version, ...fields }) => ({ ...fields, siteId, standInId: null })), { transaction });
  for (const station of site.stations) {
    if (station.standIn !== null) await StationRow.update({ standInId: station.standIn }, { where: { siteId, id: station.id }, transaction });
  }
  await StationPrinterRow.bulkCreate(site.stations.flatMap((station) => station.printers.map((printerId, position) => ({ siteId, stationId: station.id, position, printerId }))), { transaction });
};

const insertMenu = async (transaction: Transaction, { id: siteId, menu }: Site): Promise<void> => {
  await SectionRow.bulkCreate(menu.sections.map(({ id, name, position }) => ({ id, siteId, name, position })), { transaction });
  await OptionGroupRow.bulkCreate(menu.optionGroups.map(({ id, name, min, max }, position) => ({ id, siteId, name, min, max, position })), { transaction });
  await OptionRow.bulkCreate(menu.options.map(({ id, group, name, kitchenName, allergens, position }) => ({ id, siteId, optionGroupId: group, name, kitchenName, allergens: [...allergens], position })), { transaction });
  await ItemRow.bulkCreate(menu.items.map((item) => ({
    id: item.id, siteId, sectionId: item.section, name: item.name, kitchenName: item.kitchenName, allergens: [...item.allergens], courseId: item.course,
    preparationSeconds: item.preparationSeconds, soldOut: item.soldOut, left: item.left, noTicket: item.noTicket, position: item.position,
  })), { transaction });
  await ItemOptionGroupRow.bulkCreate(menu.items.flatMap((item) => item.optionGroups.map((optionGroupId, position) => ({ siteId, itemId: item.id, position, optionGroupId }))), { transaction });
};

export type PlanVersionRecord = { readonly number: number; readonly content: PlanContent; readonly summary: string; readonly madeBy: string | null; readonly madeAt: Date };

type HistoryOf = (plan: Plan) => readonly PlanVersionRecord[];

const insertPlans = async (transaction: Transaction, site: Site, historyOf: HistoryOf): Promise<void> => {
  const siteId = site.id;
  for (const plan of site.plans) {
    await PlanRow.create({ id: plan.id, siteId, name: plan.name, position: plan.position, offersAll: plan.offers === null, version: plan.version }, { transaction });
    await replacePlanContent(transaction, siteId, plan.id, plan);
    await PlanVersionRow.bulkCreate(historyOf(plan).map((version) => ({ siteId, planId: plan.id, ...version })), { transaction });
    await WeeklyTimeRow.bulkCreate(plan.weeklyTimes.map(({ weekday, start }) => ({ siteId, planId: plan.id, weekday, start })), { transaction });
  }
};

const asItCameIn = (now: Date): HistoryOf => ({ version, offers, rules }) =>
  [{ number: version, content: { offers, rules }, summary: 'As it came in', madeBy: null, madeAt: now }];

/**
 * Writes a whole site that is not there yet. Its rows start at version 1, its plans at their own. What is live elsewhere is
 * not live here: nothing is, until somebody puts a plan live.
 *
 * @param historyOf the versions of each plan, the newest last; without it each begins as it came in
 */
export const insertSite = async (transaction: Transaction, site: Site, now: Date, historyOf: HistoryOf = asItCameIn(now)): Promise<void> => {
  const { network, namingPolicy, link } = site;
  await SiteRow.create({
    id: site.id, name: site.name, place: site.place, timeZone: site.timeZone, language: site.language,
    subnet: network.subnet, gateway: network.gateway, poolFrom: network.poolFrom, poolTo: network.poolTo,
    nameMinLength: namingPolicy.minLength, nameMaxLength: namingPolicy.maxLength, nameAllowUnderscore: namingPolicy.allowUnderscore,
    nameAllowHyphen: namingPolicy.allowHyphen, nameMustStartWithLetter: namingPolicy.mustStartWithLetter,
    follows: site.follows, linkKind: link.kind, linkAddress: link.kind === 'own' ? link.address : '', linkMask: link.kind === 'own' ? link.mask : '',
  }, { transaction });
  await insertSurroundings(transaction, site);
  await insertDevices(transaction, site);
  await insertStations(transaction, site);
  await insertMenu(transaction, site);
  await insertPlans(transaction, site, historyOf);
  if (link.kind === 'till') await SiteRow.update({ linkTillId: link.till }, { where: { id: site.id }, transaction });
};
