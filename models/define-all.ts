import type { Sequelize } from 'sequelize';
import { definePersonRow } from './person';
import { defineSiteRow } from './site';
import { defineMembershipRow } from './membership';
import { defineInvitationRow } from './invitation';
import { defineReservedAddressRow } from './reserved-address';
import { defineContactRow } from './contact';
import { defineCourseRow } from './course';
import { defineSharedPointRow } from './shared-point';
import { defineAreaRow } from './area';
import { defineTillRow } from './till';
import { defineTillOrderTypeRow } from './till-order-type';
import { defineTillSharedPointRow } from './till-shared-point';
import { definePrinterRow } from './printer';
import { definePrinterSharedPointRow } from './printer-shared-point';
import { defineQueueRow } from './queue';
import { defineStationRow } from './station';
import { defineStationPrinterRow } from './station-printer';
import { defineSectionRow } from './section';
import { defineItemRow } from './item';
import { defineOptionGroupRow } from './option-group';
import { defineOptionRow } from './option';
import { defineItemOptionGroupRow } from './item-option-group';
import { definePlanRow } from './plan';
import { definePlanSectionRow } from './plan-section';
import { defineWeeklyTimeRow } from './weekly-time';
import { defineRuleRow } from './rule';
import { defineRuleStationRow } from './rule-station';
import { defineRuleOrderTypeRow } from './rule-order-type';
import { defineRuleAreaRow } from './rule-area';
import { defineRuleTillRow } from './rule-till';
import { definePlanVersionRow } from './plan-version';
import { defineLiveTillRow } from './live-till';
import { defineDivertRow } from './divert';
import { defineDivertStationRow } from './divert-station';
import { defineChangeRow } from './change';
import { defineSessionRow } from './session';

/** Ties every model to one connection. References are the database's to hold; queries here read tables, not graphs. */
export const defineAll = (sequelize: Sequelize): void => {
  for (const define of [
    definePersonRow,
    defineSiteRow,
    defineMembershipRow,
    defineInvitationRow,
    defineReservedAddressRow,
    defineContactRow,
    defineCourseRow,
    defineSharedPointRow,
    defineAreaRow,
    defineTillRow,
    defineTillOrderTypeRow,
    defineTillSharedPointRow,
    definePrinterRow,
    definePrinterSharedPointRow,
    defineQueueRow,
    defineStationRow,
    defineStationPrinterRow,
    defineSectionRow,
    defineItemRow,
    defineOptionGroupRow,
    defineOptionRow,
    defineItemOptionGroupRow,
    definePlanRow,
    definePlanSectionRow,
    defineWeeklyTimeRow,
    defineRuleRow,
    defineRuleStationRow,
    defineRuleOrderTypeRow,
    defineRuleAreaRow,
    defineRuleTillRow,
    definePlanVersionRow,
    defineLiveTillRow,
    defineDivertRow,
    defineDivertStationRow,
    defineChangeRow,
    defineSessionRow,
  ]) define(sequelize);
};
