import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { writeSiteFile } from '@/lib/domain/site-file/read-site-file';
import { asId } from '@/lib/domain/site/ids';
import { anItem, aPlan, aPrinter, aRule, aSection, aSite, aStation, aTill } from '@/tests/fixtures/build-site';

const folder = mkdtempSync(path.join(tmpdir(), 'tamis-prove-'));
afterAll(() => rmSync(folder, { recursive: true }));

const root = path.resolve(import.meta.dirname, '../..');
const prove = (...words: readonly string[]): { readonly status: number | null; readonly answer: Record<string, never> } => {
  const { status, stdout } = spawnSync(process.execPath, ['--import', 'tsx', 'scripts/prove.ts', ...words], { cwd: root, encoding: 'utf8' });
  return { status, answer: JSON.parse(stdout) as Record<string, never> };
};
const file = (name: string, text: string): string => {
  const place = path.join(folder, name);
  writeFileSync(place, text);
  return place;
};

const tested = '2026-12-01T10:00:00.000Z';
const site = (rules: readonly ReturnType<typeof aRule>[]) => aSite({
  areas: [{ id: asId('room'), name: 'Main room', version: 1 }],
  tills: [aTill('till1', 'room', '10.20.30.61', { queues: [{ printer: asId('GRILL1'), typedName: 'GRILL1', portKind: 'tcp', portAddress: '10.20.30.201:9100', testPrintedAt: tested }] })],
  printers: [aPrinter('GRILL1', '10.20.30.201')],
  stations: [aStation('grill', ['GRILL1'], { name: 'Grill', code: 'GR' })],
  menu: { sections: [aSection('meat')], items: [anItem('steak', 'meat')] },
  plans: [aPlan(rules)],
});
const whole = file('whole.json', writeSiteFile(site([aRule('r1', 'send', { kind: 'section', section: asId('meat') }, ['grill'])])));
const torn = file('torn.json', writeSiteFile(site([])));

describe('npm run prove', { timeout: 30_000 }, () => {
  it('ends with 0 when nothing is to fix, and with 1 on a stop, without a database or a server', () => {
    expect(prove(whole).status).toBe(0);
    const { status, answer } = prove(torn, '--plan', 'dinner');
    expect(status).toBe(1);
    expect(answer).toMatchObject({ plans: [{ plan: 'Dinner', proof: { outcomes: { lost: 3 } } }] });
  });

  it('sends an order, and refuses a wrong one line by line', () => {
    const order = (quantity: number): string => file(`order-${quantity}.json`, JSON.stringify({ till: 'till1', orderType: 'eat-in', lines: [{ item: 'steak', quantity }] }));
    expect(prove(whole, '--order', order(2))).toMatchObject({ status: 0, answer: { plans: [{ order: { ok: true, routed: { tickets: [{ printerName: 'GRILL1' }] } } }] } });
    expect(prove(whole, '--order', order(1_000))).toMatchObject({ status: 1, answer: { plans: [{ order: { ok: false, refusals: [{ line: 0, code: 'quantity-outside' }] } }] } });
  });

  it('drills every fault when asked', () => {
    expect(prove(whole, '--drill').answer).toMatchObject({ plans: [{ drill: { single: [{ name: 'GRILL1' }, { name: 'Grill' }], pairs: [] } }] });
  });

  it('ends with 2 and the path of each fault for a file that cannot be taken', () => {
    const dangling = file('dangling.json', writeSiteFile({ ...site([]), tills: [aTill('till1', 'cellar', '10.20.30.61')] }));
    expect(prove(dangling)).toMatchObject({ status: 2, answer: { faults: [{ path: 'site.tills[0].area', message: 'There is no area with the id “cellar”.' }] } });
    expect(prove(file('other.json', '{'))).toMatchObject({ status: 2, answer: { faults: [{ path: '' }] } });
    expect(prove(whole, '--plan', 'brunch')).toMatchObject({ status: 2 });
  });
});
