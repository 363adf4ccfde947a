'use client';

import { useId, useState, useTransition } from 'react';
import { Button } from '@/components/button';
import { FormPart } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { sayInstant } from '@/lib/domain/devices/say-instant';
import type { Printer } from '@/lib/domain/site/printer';
import { ProblemError } from '@/lib/http/client';
import { markDown } from '../api/printers';

type DownProps = { readonly siteId: string; readonly timeZone: string; readonly printer: Printer; readonly backup: string | null; readonly changed: () => void };

/** Says that a printer has stopped, and what takes over, before the press. */
export function PrinterDown({ siteId, timeZone, printer, backup, changed }: DownProps) {
  const id = useId();
  const [reason, setReason] = useState('');
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();
  const mark = (down: boolean): void => startTransition(async () => {
    try {
      await markDown(siteId, printer.id, { down, reason });
      setReason('');
      setRefused('');
      changed();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    }
  });
  return (
    <FormPart title={printer.downSince === null ? 'Has it stopped?' : 'It has stopped'}>
      {printer.downSince === null ? (
        <>
          <TextField id={id} label="Why" hint={backup === null ? 'It has no backup: what prints only here is lost while it is down.' : `${backup} takes over while it is down.`} value={reason} onChange={(event) => setReason(event.target.value)} />
          <div><Button disabled={busy} onClick={() => mark(true)}>Mark {printer.name} down</Button></div>
        </>
      ) : (
        <>
          <p className="text-[13.5px]">Down since {sayInstant(printer.downSince, timeZone)}{printer.downReason === '' ? '.' : `: ${printer.downReason}`}</p>
          <div><Button kind="primary" disabled={busy} onClick={() => mark(false)}>{printer.name} prints again</Button></div>
        </>
      )}
      <p role="status" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
    </FormPart>
  );
}
