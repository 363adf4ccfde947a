import { buildMenu } from '../build-menu';
import { coldSections, oysterSection } from './menu/cold';
import { dessertSection } from './menu/desserts';
import { drinkSections } from './menu/drinks';
import { grillSections } from './menu/grill';
import { hotSections, lateSection } from './menu/hot';
import { optionGroups } from './menu/options';

/** 182 items in 14 menu sections. */
export const menu = buildMenu(
  [...grillSections, ...coldSections, ...hotSections, dessertSection, ...drinkSections, lateSection, oysterSection],
  optionGroups,
  { 'Venison haunch, juniper': { soldOut: true }, 'Côte de boeuf for two': { left: 4 } },
);
