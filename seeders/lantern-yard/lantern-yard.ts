import { asId } from '@/lib/domain/site/ids';
import type { DemoSite } from '../demo-site';
import { menu } from './menu';
import { dinnerLiveVersion, plans } from './plans';
import { printers } from './printers';
import { stations } from './stations';
import { areas, contacts, courses, network, sharedPoints } from './surroundings';
import { tillsTestedAt } from './tills';

/** A restaurant of real size, with a few mistakes to find. */
export const lanternYard: DemoSite = {
  plans,
  live: { plan: 'Dinner', version: dinnerLiveVersion },
  siteTestedAt: (testedAt) => ({
    id: asId('lantern-yard'), name: 'Lantern Yard', place: 'Portmere', timeZone: 'Europe/London', language: 'en-GB', network,
    namingPolicy: { minLength: 2, maxLength: 12, allowUnderscore: true, allowHyphen: true, mustStartWithLetter: true },
    follows: 'by-hand', link: { kind: 'none' }, contacts, courses, sharedPoints, areas, tills: tillsTestedAt(testedAt), printers, stations, menu, version: 1,
  }),
};
