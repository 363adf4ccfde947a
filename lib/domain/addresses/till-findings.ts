import type { Finding, Fix } from '../findings/finding';
import type { Till } from '../site/till';
import { judgeDeviceAddress, siteMaskOf, type Device, type JudgeOptions } from './device-findings';
import { maskFinding } from './mask-findings';
import { nextFreeAddress } from './next-free-address';
import { readAddress } from './read-address';
import { rangeOf } from './special-ranges';
import type { AddressSite } from './taken-addresses';

const deviceOf = (site: AddressSite, till: Till, { promised = [], yields = false }: JudgeOptions): Device => ({
  yields,
  kind: 'till', id: till.id, name: till.name || 'This till', address: till.address, mask: till.mask,
  keepsItsAddress: till.addressSource === 'static',
  subject: { kind: 'till', id: till.id },
  free: nextFreeAddress(site, 'till', promised),
  offer: (address): readonly Fix[] => (address === null || till.addressSource !== 'static' ? []
    : [{ kind: 'set-till-address', till: till.id, address, label: `Give it ${address}` }]),
});

const unknownAddress = (till: Till): Finding => ({
  code: 'till-address-unknown', severity: 'check', subject: { kind: 'till', id: till.id, field: 'address' },
  title: `Nobody has said which address ${till.name || 'this till'} has`,
  message: 'It gets one from the router and counts as in the site\'s network until its address is known. Look it up on the till and write it here.',
  fixes: [],
});

const selfAssigned = (till: Till): Finding => ({
  code: 'till-self-assigned', severity: 'stop', subject: { kind: 'till', id: till.id, field: 'address' },
  title: `${till.name || 'This till'} got no address from the router`,
  message: `${till.address} is ${rangeOf(readAddress(till.address) ?? 0).meaning}. Look at its cable, the switch and the router.`,
  fixes: [],
});

const isSelfAssigned = (address: string): boolean => {
  const value = readAddress(address);
  return value !== null && rangeOf(value).name === 'self-assigned';
};

/** Whether a till's own address plays no part: an online channel sends through the link, a handheld may send through a till. */
const sendsThroughAnother = (till: Till): boolean => till.kind === 'online' || till.printsThrough !== null;

/** All that is wrong with where one till is. */
export const tillAddressFindings = (site: AddressSite, till: Till, options: JudgeOptions = {}): readonly Finding[] => {
  if (till.kind === 'online') return [];
  const dynamic = till.addressSource !== 'static';
  if (till.address === '' && sendsThroughAnother(till)) return [];
  if (dynamic && till.address === '') return [unknownAddress(till)];
  if (dynamic && isSelfAssigned(till.address)) return [selfAssigned(till)];
  const maskKnown = till.mask !== '' || !dynamic;
  return [
    ...judgeDeviceAddress(site, deviceOf(site, till, options)),
    ...(maskKnown ? maskFinding({
      name: till.name || 'This till', mask: till.mask, subject: { kind: 'till', id: till.id },
      offer: (mask) => ({ kind: 'set-till-mask', till: till.id, mask, label: `Use ${mask}` }),
    }, siteMaskOf(site)) : []),
  ];
};
