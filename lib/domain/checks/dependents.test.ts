import { describe, expect, it } from 'vitest';
import { aPlan, aPrinter, aRule, aSite, aStation, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import { dependentsOfArea, dependentsOfPrinter, dependentsOfTill } from './dependents';
import { printerTestsStand, queueTestStands, stageWithoutTests } from './test-stands';

const site = aSite({
  areas: [{ id: asId('main'), name: 'Main room', version: 1 }, { id: asId('yard'), name: 'Yard', version: 1 }],
  printers: [aPrinter('GRILL1', '10.20.30.201', { backup: asId('SAUCE1') }), aPrinter('SAUCE1', '10.20.30.203'), aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Till 1') })],
  stations: [aStation('Grill', ['GRILL1', 'SAUCE1']), aStation('Sauce', ['SAUCE1'])],
  tills: [
    aTill('Till 1', 'main', '10.20.30.61', { queues: [{ printer: asId('SAUCE1'), typedName: 'SAUCE1', portKind: 'tcp', portAddress: '', testPrintedAt: null }] }),
    aTill('Handheld', 'main', '', { kind: 'handheld', printsThrough: asId('Till 1') }),
    aTill('Till 2', 'main', '10.20.30.62'),
  ],
  link: { kind: 'till', till: asId('Till 1') },
  plans: [aPlan([aRule('r', 'send', { kind: 'everything' }, ['Grill'], { tills: [asId('Till 1')], areas: [asId('yard')] })])],
});

it('says what loses its printer, its backup and its queue when a printer goes', () => {
  expect(dependentsOfPrinter(site, asId('SAUCE1'))).toEqual({
    obstacles: [],
    consequences: ['Sauce has no other printer, so what is cooked there prints nowhere.', 'Grill prints on the other printers of its list.', 'GRILL1 has no backup any more.', 'It is forgotten on Till 1.'],
  });
});

it('keeps a till that rules, printers, other tills or the link need', () => {
  expect(dependentsOfTill(site, asId('Till 1')).obstacles).toEqual([
    'Dinner has rules for it. Change those on the board first; without their condition they would cover everything.',
    'BAR2 is plugged into it. Say first where it hangs now.',
    'Handheld prints through it. Give it another way first.',
    'The print link runs on it. Move the link first.',
  ]);
  expect(dependentsOfTill(site, asId('Till 2'))).toEqual({ obstacles: [], consequences: [] });
});

it('keeps an area that tills stand in or rules name', () => {
  expect(dependentsOfArea(site, asId('main')).obstacles).toEqual(['Till 1, Handheld and Till 2 stand in it. Move them first.']);
  expect(dependentsOfArea(site, asId('yard')).obstacles).toHaveLength(1);
});

describe('a printed test', () => {
  const before = aPrinter('GRILL1', '10.20.30.201');
  it.each([
    [{ address: '10.20.30.202' }, false], [{ mask: '255.255.0.0' }, false], [{ port: 9101 }, false], [{ connection: 'usb' as const }, false],
    [{ name: 'GRILL9', backup: null, buzzer: true }, true], [{ mac: '00:1B:44:11:3A:B7' }, true],
  ])('after %j stands: %s', (change, stands) => {
    expect(printerTestsStand(before, { ...before, ...change })).toBe(stands);
  });
  it('of one device says nothing of its replacement', () => {
    expect(printerTestsStand({ ...before, serial: 'A1' }, { ...before, serial: 'B2' })).toBe(false);
  });
  it('of a queue stands while its port is the same', () => {
    const queue = { portKind: 'tcp' as const, portAddress: '10.20.30.201' };
    expect([queueTestStands(queue, { ...queue }), queueTestStands(queue, { ...queue, portAddress: '10.20.30.9' }), queueTestStands(queue, { ...queue, portKind: 'shared' })]).toEqual([true, false, false]);
  });
  it('takes its stage along when it falls', () => {
    expect([stageWithoutTests('planned'), stageWithoutTests('signed-off')]).toEqual(['planned', 'addressed']);
  });
});
