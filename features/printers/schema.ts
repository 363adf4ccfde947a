import { z } from 'zod';
import { codePages, connections, emphases, printerStages, rollWidthsMm } from '@/lib/domain/site/printer';

const id = z.string().regex(/^[A-Za-z0-9._-]{1,36}$/, 'This is no id of this site.');
const idOrNone = id.nullable();
const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);

/**
 * What a person writes down about one printer. A name or an address that is wrong is kept and found by the checks:
 * refusing it would lose what was found on site.
 */
export const printerInput = z.object({
  name: z.string().min(1, 'A printer needs a name: it is how every till knows it.').max(220, 'At most 220 characters.'),
  model: words(120),
  serial: words(120),
  connection: z.enum(connections),
  hostTill: idOrNone,
  address: words(45),
  mask: words(45),
  gateway: words(45),
  port: z.number('A port is a number from 1 to 65535.').int('A port is a whole number.').min(1, 'A port is a number from 1 to 65535.').max(65_535, 'A port is a number from 1 to 65535.'),
  mac: words(40),
  presentAddress: words(45),
  rollWidthMm: z.literal([...rollWidthsMm]),
  columns: z.number('How many characters fit on a line, 16 to 96.').int('A whole number.').min(16, 'At least 16.').max(96, 'At most 96.'),
  codePage: z.enum(codePages),
  emphasis: z.enum(emphases),
  cutter: z.boolean(),
  buzzer: z.boolean(),
  backup: idOrNone,
  joinsStations: z.boolean(),
  sharedPoints: z.array(id).max(50),
  stage: z.enum(printerStages),
});
export type PrinterInput = z.infer<typeof printerInput>;

export const printerParams = z.object({ site: z.string(), printer: id });

/** Down with a reason, or up again. */
export const printerDownInput = z.object({ down: z.boolean(), reason: words(500) });
export type PrinterDownInput = z.infer<typeof printerDownInput>;

/** A test that a person saw come out of a printer, sent from a till. */
export const printedTestInput = z.object({ till: id, printed: z.boolean() });
export type PrintedTestInput = z.infer<typeof printedTestInput>;

/** Which printer takes over; null for none. */
export const backupInput = z.object({ backup: idOrNone });
