import { z } from 'zod';
import { portKinds } from '@/lib/domain/site/till';

const id = z.string().max(36);
const label = z.string().max(300);
const address = z.string().trim().max(45);
const name = z.string().min(1).max(220);
const queue = { till: id, printer: id, portKind: z.enum(portKinds), portAddress: z.string().max(255), label };

/**
 * The fixes that are changes of rows. Those of a plan are edits on the board, where they can be undone, and a test is
 * printed by hand.
 */
export const fixInput = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('rename-printer'), printer: id, name, label }),
  z.object({ kind: z.literal('set-printer-address'), printer: id, address, label }),
  z.object({ kind: z.literal('set-printer-mask'), printer: id, mask: address, label }),
  z.object({ kind: z.literal('set-printer-gateway'), printer: id, gateway: address, label }),
  z.object({ kind: z.literal('set-printer-port'), printer: id, port: z.int().min(1).max(65_535), label }),
  z.object({ kind: z.literal('set-printer-mac'), printer: id, mac: z.string().trim().max(40), label }),
  z.object({ kind: z.literal('set-backup'), printer: id, backup: id, label }),
  z.object({ kind: z.literal('rename-queue'), till: id, printer: id, name, label }),
  z.object({ kind: z.literal('rename-queues'), tills: z.array(id).min(1).max(500), printer: id, name, label }),
  z.object({ kind: z.literal('set-queue-port'), ...queue }),
  z.object({ kind: z.literal('add-queue'), name, ...queue }),
  z.object({ kind: z.literal('set-till-address'), till: id, address, label }),
  z.object({ kind: z.literal('set-till-mask'), till: id, mask: address, label }),
  z.object({ kind: z.literal('clear-prints-through'), till: id, label }),
  z.object({ kind: z.literal('clear-default-printer'), till: id, label }),
  z.object({ kind: z.literal('reserve-address'), address, reason: z.string().trim().max(200), label }),
  z.object({ kind: z.literal('set-network'), change: z.partialRecord(z.enum(['subnet', 'gateway', 'poolFrom', 'poolTo']), z.string().trim().max(50)), label }),
  z.object({ kind: z.literal('set-link-address'), address, mask: address, label }),
  z.object({ kind: z.literal('set-stand-in'), station: id, standIn: id, label }),
]);

export const fixBody = z.object({ fix: fixInput });
