import { send } from '@/lib/http/client';
import type { PrintedTestInput, PrinterDownInput, PrinterInput } from '../schema';

const printersUrl = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/printers`;
const printerUrl = (siteId: string, printer: string): string => `${printersUrl(siteId)}/${encodeURIComponent(printer)}`;

type Saved = { readonly id: string; readonly version: number };

export const addPrinter = (siteId: string, input: PrinterInput): Promise<Saved> => send('POST', printersUrl(siteId), { body: input });

export const savePrinter = (siteId: string, printer: string, version: number, input: PrinterInput): Promise<Saved> =>
  send('PUT', printerUrl(siteId, printer), { body: input, version });

export const takePrinterOff = (siteId: string, printer: string, version: number): Promise<unknown> => send('DELETE', printerUrl(siteId, printer), { version });

export const markDown = (siteId: string, printer: string, input: PrinterDownInput): Promise<unknown> => send('PUT', `${printerUrl(siteId, printer)}/down`, { body: input });

export const notePrintedTest = (siteId: string, printer: string, input: PrintedTestInput): Promise<unknown> => send('POST', `${printerUrl(siteId, printer)}/tests`, { body: input });

export const sendBackup = (siteId: string, printer: string, backup: string | null): Promise<unknown> => send('PUT', `${printerUrl(siteId, printer)}/backup`, { body: { backup } });
