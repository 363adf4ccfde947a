import { connectionWords } from '@/lib/domain/devices/printer-words';
import type { Printer } from '@/lib/domain/site/printer';
import type { Site } from '@/lib/domain/site/site';

/** "10.20.30.201", "USB on Terrace", or what is missing. */
export const whereIs = (printer: Pick<Printer, 'connection' | 'address' | 'hostTill'>, tills: Site['tills']): string => {
  if (printer.connection === 'network') return printer.address === '' ? 'No address yet' : printer.address;
  const host = tills.find((till) => till.id === printer.hostTill)?.name ?? 'no till yet';
  return `${connectionWords[printer.connection]} on ${host}`;
};
