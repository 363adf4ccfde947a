import { asId } from '@/lib/domain/site/ids';
import { anyCondition, type WeeklyTime } from '@/lib/domain/site/plan';
import type { DemoPlan } from '../demo-site';
import { copyEverything, offer, send, sendItem, splitOption, versionsOf } from '../plan-history';
import { menu } from './menu';
import { stations } from './stations';
import { areas } from './surroundings';
import { tillsTestedAt } from './tills';

const site = { menu, stations, areas, tills: tillsTestedAt('2026-01-01T00:00:00.000Z') };
const drinks = ['Cocktails', 'Wine and beer', 'Hot drinks'];
const everyDay = (start: string): readonly WeeklyTime[] => [1, 2, 3, 4, 5, 6, 7].map((weekday) => ({ weekday, start }));
const sideSalad = splitOption('burger-side-side-salad', 'Larder');

const usual = [
  send(['From the grill', 'Burgers'], 'Grill'), send(['Salads', 'Cold starters'], 'Larder'), send(['Pasta', 'Fish', 'Sides'], 'Sauce'),
  send(['Desserts'], 'Pastry'), send(drinks, 'Bar'), copyEverything('Pass'),
];

/**
 * What Dinner is live at. Its last three edits came later and are not live yet: the side salad splits, and Late menu and
 * Oysters are offered, though no rule sends them anywhere. That is the mistake to find.
 */
export const dinnerLiveVersion = 8;

const dinnerOffers = ['From the grill', 'Burgers', 'Sunday roast', 'Salads', 'Cold starters', 'Pasta', 'Fish', 'Sides', 'Desserts', ...drinks];
const dinnerEdits = [...usual, send(['Sunday roast'], 'Grill'), sideSalad, offer(site, 'Late menu'), offer(site, 'Oysters')];

const lunchOffers = [...dinnerOffers.filter((section) => section !== 'Sunday roast'), 'Oysters'];
const lunchEdits = [
  ...usual, send(['Oysters'], 'Larder'), sideSalad, sendItem('Cheese board', 'Larder'),
  send(['Desserts'], 'Larder', { ...anyCondition, orderTypes: ['take-away', 'delivery'] }),
  send(['Fish'], 'Grill', { ...anyCondition, areas: [asId('terrace')] }),
];

const breakfastEdits = [send(['Sides'], 'Sauce'), send(['Late menu'], 'Grill'), send(['Hot drinks'], 'Bar'), sendItem('Sourdough and butter', 'Larder'), copyEverything('Pass')];

const quietOffers = ['Burgers', 'Salads', 'Sides', 'Desserts', ...drinks, 'Late menu'];
const quietEdits = [send(['Burgers', 'Sides', 'Late menu'], 'Grill'), send(['Salads', 'Desserts'], 'Larder'), send(drinks, 'Bar'), copyEverything('Pass'), sideSalad];

export const plans: readonly DemoPlan[] = [
  { name: 'Breakfast', weeklyTimes: everyDay('07:00'), versions: versionsOf(site, 'Breakfast', ['Sides', 'Late menu', 'Hot drinks'], breakfastEdits) },
  { name: 'Lunch', weeklyTimes: everyDay('11:30'), versions: versionsOf(site, 'Lunch', lunchOffers, lunchEdits) },
  { name: 'Dinner', weeklyTimes: everyDay('17:00'), versions: versionsOf(site, 'Dinner', dinnerOffers, dinnerEdits) },
  { name: 'Quiet night', weeklyTimes: everyDay('22:00'), versions: versionsOf(site, 'Quiet night', quietOffers, quietEdits) },
];
