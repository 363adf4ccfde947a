import { may, type Membership, type Permission } from '../roles/permissions';
import type { Fix } from './finding';

/** The right that pressing a fix home takes: the same as making the change by hand. */
export const fixPermissions = {
  'rename-printer': 'printer.write',
  'set-printer-address': 'printer.write',
  'set-printer-mask': 'printer.write',
  'set-printer-gateway': 'printer.write',
  'set-printer-port': 'printer.write',
  'set-printer-mac': 'printer.write',
  'set-backup': 'printer.set-backup',
  'print-test': 'printer.test',
  'rename-queue': 'till.write',
  'rename-queues': 'till.write',
  'set-queue-port': 'till.write',
  'add-queue': 'till.write',
  'set-till-address': 'till.write',
  'set-till-mask': 'till.write',
  'clear-prints-through': 'till.write',
  'clear-default-printer': 'till.write',
  'reserve-address': 'network.write',
  'set-network': 'network.write',
  'set-link-address': 'network.write',
  'set-stand-in': 'station.write',
  'send-sections': 'plan.write',
  'remove-rule': 'plan.write',
} as const satisfies Readonly<Record<Fix['kind'], Permission>>;

export const mayFix = (membership: Membership, fix: Pick<Fix, 'kind'>): boolean => may(membership, fixPermissions[fix.kind]);
