import { decodeFile } from '@/lib/domain/menu-file/decode-file';
import { guessMapping } from '@/lib/domain/menu-file/fields';
import { planImport } from '@/lib/domain/menu-file/plan-import';
import { readTable } from '@/lib/domain/menu-file/read-table';
import { aSite } from '@/tests/fixtures/build-site';
import type { Figure } from './figure';

const count = 5_000;

/** Reading, checking and planning a menu of 5,000 items; writing it to the database is not in this figure. */
const bench = async (): Promise<readonly Figure[]> => {
  const lines = Array.from({ length: count }, (_, index) => `Section ${index % 60},Dish number ${index},DISH ${index},"gluten, milk",${index % 600},,,"Side (0-1): Salad; Chips"`);
  const bytes = new TextEncoder().encode(['Section,Item,Kitchen name,Allergens,Seconds,Sold out,Left,Options', ...lines].join('\r\n'));
  const start = performance.now();
  const decoded = decodeFile(bytes);
  const reading = decoded.ok ? readTable(decoded.text) : { ok: false as const };
  let number = 0;
  const plan = reading.ok ? planImport(aSite(), reading.table, guessMapping(reading.table.headings), () => `id-${(number += 1)}`) : null;
  const seconds = (performance.now() - start) / 1000;
  return [
    { name: 'items read from a menu file', value: plan?.creates.length ?? 0, unit: 'items', goal: `= ${count}`, holds: plan?.creates.length === count },
    { name: 'reading and checking 5,000 items', value: Math.round(seconds * 1000) / 1000, unit: 's', goal: '<= 3', holds: seconds <= 3 },
  ];
};
export default bench;
