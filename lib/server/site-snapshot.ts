import 'server-only';
import type { Transaction } from 'sequelize';
import { asId } from '@/lib/domain/site/ids';
import type { Menu } from '@/lib/domain/site/menu';
import { orderTypes } from '@/lib/domain/site/order-types';
import type { Plan } from '@/lib/domain/site/plan';
import type { PrintLink, Site } from '@/lib/domain/site/site';
import { SiteRow } from '@/models/site';
import { inTransaction } from './database';
import { loadMenu } from './snapshot/load-menu';
import { loadPlans } from './snapshot/load-plans';
import { loadPrinters, loadStations, loadTills } from './snapshot/load-devices';
import { loadSurroundings } from './snapshot/load-surroundings';

const linkOf = (row: SiteRow): PrintLink => {
  if (row.linkKind === 'till' && row.linkTillId !== null) return { kind: 'till', till: asId(row.linkTillId) };
  return row.linkKind === 'own' ? { kind: 'own', address: row.linkAddress, mask: row.linkMask } : { kind: 'none' };
};

/** Offered sections stand in the menu's order, as an edit on the board leaves them. */
const inMenuOrder = (plan: Plan, menu: Menu): Plan => {
  if (plan.offers === null) return plan;
  const offered = new Set(plan.offers);
  return { ...plan, offers: menu.sections.filter(({ id }) => offered.has(id)).map(({ id }) => id) };
};

const readSite = async (siteId: string, transaction: Transaction): Promise<Site | null> => {
  const within = { where: { siteId }, transaction };
  const row = await SiteRow.findByPk(siteId, { transaction });
  if (row === null) return null;
  const [surroundings, tills, printers, stations, menu, planned] = await Promise.all([
    loadSurroundings(within), loadTills(within, orderTypes), loadPrinters(within), loadStations(within), loadMenu(within), loadPlans(within),
  ]);
  const { reserved, ...around } = surroundings;
  return {
    id: asId(row.id), name: row.name, place: row.place, timeZone: row.timeZone, language: row.language, version: row.version,
    network: { subnet: row.subnet, gateway: row.gateway, poolFrom: row.poolFrom, poolTo: row.poolTo, reserved },
    namingPolicy: {
      minLength: row.nameMinLength, maxLength: row.nameMaxLength, allowUnderscore: row.nameAllowUnderscore, allowHyphen: row.nameAllowHyphen,
      mustStartWithLetter: row.nameMustStartWithLetter,
    },
    follows: row.follows, link: linkOf(row), ...around, tills, printers, stations, menu, plans: planned.plans.map((plan) => inMenuOrder(plan, menu)),
    live: row.livePlanId === null || row.liveVersion === null || row.liveSince === null ? null : {
      planId: asId(row.livePlanId), version: row.liveVersion, since: row.liveSince.toISOString(),
      inForceOn: planned.liveTills.filter((till) => till.planId === row.livePlanId && till.version === row.liveVersion).map((till) => asId(till.tillId)),
    },
  };
};

/**
 * Reads a whole site as one value; null when there is none. Lists come sorted, so that equal rows give equal values. It is
 * read in one transaction, given or its own, so that no change in between leaves a rule without its stations.
 */
export const loadSite = async (siteId: string, transaction?: Transaction): Promise<Site | null> =>
  transaction === undefined ? inTransaction((own) => readSite(siteId, own)) : readSite(siteId, transaction);
