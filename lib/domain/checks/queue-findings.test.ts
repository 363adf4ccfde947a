import { describe, expect, it } from 'vitest';
import { aPrinter, aSite, aTill } from '@/tests/fixtures/build-site';
import { asId } from '@/lib/domain/site/ids';
import type { Queue, Till } from '@/lib/domain/site/till';
import { addressInPort, defaultPrinterFinding, queueFindings } from './queue-findings';

const pass = aPrinter('PASS1', '10.20.30.210');
const usb = aPrinter('BAR2', '', { connection: 'usb', hostTill: asId('Terrace') });
const lpt = aPrinter('OLD1', '', { connection: 'parallel', hostTill: asId('Till 3') });
const aQueue = (printer: string, more: Partial<Queue> = {}): Queue =>
  ({ printer: asId(printer), typedName: printer, portKind: 'tcp', portAddress: '10.20.30.210:9100', testPrintedAt: null, ...more });
const tillWith = (queue: Queue, name = 'Till 3'): Till => aTill(name, 'main', '10.20.30.63', { queues: [queue] });
const findingsOf = (till: Till) => queueFindings(aSite({ printers: [pass, usb, lpt], tills: [till, aTill('Terrace', 'terrace', '10.20.30.64')] }), till);

it('says nothing of a queue that is as it should be', () => {
  expect(findingsOf(tillWith(aQueue('PASS1')))).toEqual([]);
  expect(findingsOf(tillWith(aQueue('BAR2', { portKind: 'usb', portAddress: 'USB001' }), 'Terrace'))).toEqual([]);
  expect(findingsOf(tillWith(aQueue('OLD1', { portKind: 'parallel', portAddress: 'LPT1:' })))).toEqual([]);
});

it('stops a name typed differently, even in case alone', () => {
  for (const typedName of ['PASS 1', 'pass1', 'PASS1 ', '']) {
    expect(findingsOf(tillWith(aQueue('PASS1', { typedName })))).toMatchObject([{
      code: 'queue-typed-differently', severity: 'stop', subject: { kind: 'queue', id: 'PASS1', till: 'Till 3', field: 'queues.0.typedName' },
      fixes: [{ kind: 'rename-queue', till: 'Till 3', printer: 'PASS1', name: 'PASS1' }],
    }]);
  }
});

it('offers to say it once when several tills have the same old name', () => {
  const tills = ['Till 1', 'Till 2'].map((name) => tillWith(aQueue('PASS1', { typedName: 'PASS 1' }), name));
  const [finding] = queueFindings(aSite({ printers: [pass], tills }), tills[0]!);
  expect(finding?.fixes.at(-1)).toEqual({ kind: 'rename-queues', tills: ['Till 1', 'Till 2'], printer: 'PASS1', name: 'PASS1', label: 'All 2 tills read PASS1 now' });
});

it('says where a queue on a parallel port leads, and where it should', () => {
  expect(findingsOf(tillWith(aQueue('PASS1', { portKind: 'parallel', portAddress: 'LPT1:' })))).toMatchObject([{
    code: 'queue-parallel-nothing', severity: 'stop', title: 'On Till 3, PASS1 goes to a parallel port',
    message: 'Driver installers often pick one by themselves. Nothing is plugged in there, so tickets wait for ever.',
    fixes: [{ kind: 'set-queue-port', portKind: 'tcp', portAddress: '10.20.30.210:9100' }],
  }]);
});

it('stops a parallel queue for a parallel printer that hangs on another till', () => {
  expect(findingsOf(tillWith(aQueue('OLD1', { portKind: 'parallel', portAddress: 'LPT1:' }), 'Till 2'))).toMatchObject([{ code: 'queue-parallel-nothing', fixes: [] }]);
});

it.each([
  ['10.20.30.99:9100', 'On Till 3, PASS1 goes to 10.20.30.99'],
  ['IP_10.20.30.99', 'On Till 3, PASS1 goes to 10.20.30.99'],
  ['socket://10.20.30.210:9101', 'On Till 3, PASS1 goes to 10.20.30.210, port 9101'],
])('stops a queue to %s, where its printer is not', (portAddress, title) => {
  expect(findingsOf(tillWith(aQueue('PASS1', { portAddress })))).toMatchObject([{ code: 'queue-port-elsewhere', severity: 'stop', title }]);
});

it.each(['10.20.30.210', 'IP_10.20.30.210', 'socket://10.20.30.210:9100', 'passprinter.local', ''])('takes %j for the printer, or cannot know better', (portAddress) => {
  expect(findingsOf(tillWith(aQueue('PASS1', { portAddress })))).toEqual([]);
});

it('asks for a look at a shared port, and names the computer it hangs on', () => {
  expect(findingsOf(tillWith(aQueue('BAR2', { portKind: 'shared', portAddress: '\\\\TERRACE\\BAR2' })))).toMatchObject([{
    code: 'queue-shared', severity: 'check', title: 'On Till 3, BAR2 prints through Terrace', fixes: [],
  }]);
  expect(findingsOf(tillWith(aQueue('PASS1', { portKind: 'shared', portAddress: '\\\\OFFICE\\PASS1' })))).toMatchObject([{ fixes: [{ kind: 'set-queue-port', portKind: 'tcp' }] }]);
});

describe('an address in a port', () => {
  it.each([
    ['10.20.30.210:9100', { address: '10.20.30.210', port: 9100 }], ['IP_10.20.30.210', { address: '10.20.30.210', port: null }],
    ['10.20.30', null], ['1.2.3.4.5', null], ['LPT1:', null],
  ])('%s', (text, found) => {
    expect(addressInPort(text)).toEqual(found);
  });
});

it('asks for a look at a ticket printer that reports would come out of', () => {
  const till = aTill('Till 3', 'main', '10.20.30.63', { defaultPrinter: pass.id });
  expect(defaultPrinterFinding(aSite({ printers: [pass], tills: [till] }), till)).toMatchObject([{ code: 'till-default-printer', severity: 'check', fixes: [{ kind: 'clear-default-printer', till: 'Till 3' }] }]);
});
