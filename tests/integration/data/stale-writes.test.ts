import { beforeEach, describe, expect, it } from 'vitest';
import { inTransaction } from '@/lib/server/database';
import { recordChange } from '@/lib/server/history';
import { deleteVersioned, RowMissing, StaleWrite, updateVersioned } from '@/lib/server/versioned-update';
import { OptionGroupRow } from '@/models/option-group';
import { PrinterRow } from '@/models/printer';
import { SiteRow } from '@/models/site';
import { seedDatabase } from '@/tests/setup/demo-database';

beforeEach(seedDatabase);

const grill = { siteId: 'lantern-yard', id: 'grill1', version: 1 };
const serialOf = async (id: string): Promise<string | undefined> => (await PrinterRow.findOne({ where: { siteId: 'lantern-yard', id } }))?.serial;

const rename = (key: typeof grill, serial: string): Promise<PrinterRow> =>
  inTransaction(async (transaction) => {
    const row = await updateVersioned(PrinterRow, key, { serial }, transaction);
    await recordChange(transaction, { siteId: key.siteId, personId: 'femi-lindqvist', action: 'printer.updated', subjectKind: 'printer', subjectId: key.id, summary: `GRILL1 has the serial ${serial}` });
    return row;
  });

const refused = (work: Promise<unknown>): Promise<unknown> => work.then(() => 'written', (error: unknown) => error);

describe('two people write one thing', () => {
  it('writes the first and raises the version', async () => {
    expect(await rename(grill, 'A')).toMatchObject({ serial: 'A', version: 2 });
  });

  it('refuses the second with what is there now, who wrote it and when', async () => {
    await rename(grill, 'A');
    const error = await refused(rename(grill, 'B'));
    expect(error).toBeInstanceOf(StaleWrite);
    expect(error).toMatchObject({
      subjectKind: 'printer', subjectId: 'grill1', version: 2, current: { serial: 'A', siteId: 'lantern-yard' },
      lastChange: { by: 'Femi Lindqvist', summary: 'GRILL1 has the serial A', at: expect.stringMatching(/^\d{4}-.*Z$/) as string },
    });
    expect(await serialOf('grill1')).toBe('A');
  });

  it('lets exactly one of many at once through, and tells the others of it', async () => {
    const outcomes = await Promise.all(Array.from({ length: 8 }, (_, index) => refused(rename(grill, `S${index}`))));
    expect(outcomes.filter((one) => one === 'written')).toHaveLength(1);
    expect(outcomes.filter((one) => one instanceof StaleWrite && one.version === 2)).toHaveLength(7);
  });

  it('refuses with the row of now even when the transaction has read the older one', async () => {
    const error = await refused(inTransaction(async (transaction) => {
      await PrinterRow.findOne({ where: { siteId: 'lantern-yard', id: 'grill1' }, transaction });
      await rename(grill, 'A');
      return updateVersioned(PrinterRow, grill, { serial: 'B' }, transaction);
    }));
    expect(error).toMatchObject({ name: 'StaleWrite', version: 2, current: { serial: 'A' }, lastChange: { summary: 'GRILL1 has the serial A' } });
  });

  it('refuses to delete what was written since, and deletes what was not', async () => {
    const empty = { siteId: 'lantern-yard', id: 'new', version: 1 };
    await OptionGroupRow.create({ siteId: 'lantern-yard', id: 'new', name: 'Sauces', min: 0, max: 1, position: 9 });
    const stale = await refused(inTransaction((transaction) => deleteVersioned(OptionGroupRow, { ...empty, version: 4 }, transaction)));
    expect(stale).toMatchObject({ name: 'StaleWrite', subjectKind: 'option-group', lastChange: null });
    await inTransaction((transaction) => deleteVersioned(OptionGroupRow, empty, transaction));
    expect(await OptionGroupRow.count({ where: { siteId: 'lantern-yard', id: 'new' } })).toBe(0);
  });

  it('writes the settings of a site in the same way', async () => {
    const key = { siteId: 'lantern-yard', id: 'lantern-yard', version: 1 };
    await inTransaction((transaction) => updateVersioned(SiteRow, key, { place: 'Portmere Quay' }, transaction));
    expect(await refused(inTransaction((transaction) => updateVersioned(SiteRow, key, { place: 'Elsewhere' }, transaction)))).toMatchObject({ name: 'StaleWrite', current: { place: 'Portmere Quay' } });
  });
});

describe('two sites with the same id', () => {
  it('are written and deleted one without the other', async () => {
    for (const siteId of ['lantern-yard', 'pilgrims-oven']) await OptionGroupRow.create({ siteId, id: 'twin', name: 'Twin', min: 0, max: 1, position: 9 });
    await inTransaction((transaction) => updateVersioned(OptionGroupRow, { siteId: 'lantern-yard', id: 'twin', version: 1 }, { max: 3 }, transaction));
    expect(await OptionGroupRow.findAll({ where: { id: 'twin' }, order: ['siteId'], raw: true })).toMatchObject([{ max: 3, version: 2 }, { max: 1, version: 1 }]);
    await inTransaction((transaction) => deleteVersioned(OptionGroupRow, { siteId: 'lantern-yard', id: 'twin', version: 2 }, transaction));
    expect(await OptionGroupRow.findAll({ where: { id: 'twin' }, raw: true })).toMatchObject([{ siteId: 'pilgrims-oven' }]);
  });

  it('says of a row of another site that it is not there', async () => {
    const error = await refused(inTransaction((transaction) => updateVersioned(PrinterRow, { siteId: 'pilgrims-oven', id: 'grill1', version: 1 }, { serial: 'X' }, transaction)));
    expect(error).toBeInstanceOf(RowMissing);
    expect(await serialOf('grill1')).toBe('CT80-26-0201');
  });
});
