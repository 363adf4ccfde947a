import { stringify } from 'csv-stringify/sync';
import type { Site } from '@/lib/domain/site/site';
import { fieldWords, menuFields } from './fields';
import { writeGroups } from './option-cell';
import { makeSafe } from './safe-cell';

const yesOrNot = (value: boolean): string => (value ? 'yes' : '');

/** A site's menu as a table of text, one line an item, CRLF as in RFC 4180; what a spreadsheet would run is made safe. */
export const writeMenuFile = (site: Pick<Site, 'menu' | 'courses'>): string => {
  const { menu } = site;
  const sections = new Map(menu.sections.map((section) => [section.id, section.name]));
  const courses = new Map(site.courses.map((course) => [course.id, course.name]));
  const options = new Map(menu.options.map((option) => [option.id, option]));
  const groups = new Map(menu.optionGroups.map((group) => [group.id, {
    name: group.name, min: group.min, max: group.max, options: group.options.flatMap((id) => options.get(id) ?? []),
  }]));
  const rows = menu.items.map((item) => [
    sections.get(item.section) ?? '', item.name, item.kitchenName, item.course === null ? '' : courses.get(item.course) ?? '', item.allergens.join(', '),
    item.preparationSeconds === null ? '' : String(item.preparationSeconds), yesOrNot(item.soldOut), item.left === null ? '' : String(item.left), yesOrNot(item.noTicket),
    writeGroups(item.optionGroups.flatMap((id) => groups.get(id) ?? [])),
  ].map(makeSafe));
  return stringify([menuFields.map((field) => fieldWords[field]), ...rows], { record_delimiter: 'windows' });
};
