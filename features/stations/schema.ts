import { z } from 'zod';
import { meshes, stationColours, stationKinds, ticketLayouts } from '@/lib/domain/site/station';

const id = z.string().min(1).max(36);

/** One schema for the form and the server. What other stations hold against it is checked beside it. */
export const stationInput = z.strictObject({
  name: z.string().normalize('NFC').trim().min(1, 'A station needs a name.').max(60, 'A station’s name has at most 60 characters.').regex(/^[^\u0000-\u001f\u007f]*$/, 'The name has a control character in it.'),
  code: z.string().regex(/^[A-Z]{2}$/, 'A code has two capital letters.'),
  kind: z.enum(stationKinds),
  mesh: z.enum(meshes),
  colour: z.enum(stationColours),
  printers: z.array(id).max(20),
  open: z.boolean(),
  standIn: id.nullable(),
  layout: z.enum(ticketLayouts),
  ticketsPerSending: z.int().min(1).max(3),
  pace: z.int('Say whole items.').min(1, 'At least one item, or leave it empty.').max(1_000).nullable(),
});
export type StationInput = z.output<typeof stationInput>;

export const siteParams = z.object({ site: id });
export const stationParams = z.object({ site: id, station: id });
export const orderInput = z.strictObject({ ids: z.array(id).min(1).max(200) });
