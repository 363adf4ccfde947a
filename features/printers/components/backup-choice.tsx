'use client';

import { useId, useState, useTransition } from 'react';
import { ChoiceField } from '@/components/form/choice-field';
import { FormPart } from '@/components/form/form-part';
import type { Printer } from '@/lib/domain/site/printer';
import { ProblemError } from '@/lib/http/client';
import { sendBackup } from '../api/printers';

type BackupProps = { readonly siteId: string; readonly printer: Printer; readonly others: readonly Printer[]; readonly changed: () => void };

/** The one setting of a printer that is a chef's too: which printer takes over. Saved as it is chosen. */
export function BackupChoice({ siteId, printer, others, changed }: BackupProps) {
  const id = useId();
  const [refused, setRefused] = useState('');
  const [busy, startTransition] = useTransition();
  const choose = (backup: string): void => startTransition(async () => {
    try {
      await sendBackup(siteId, printer.id, backup === '' ? null : backup);
      setRefused('');
      changed();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
    }
  });
  return (
    <FormPart title="When it stops">
      <ChoiceField
        id={id}
        label="Backup"
        none="No backup"
        choices={others.map((other) => ({ value: other.id, words: other.name }))}
        value={printer.backup ?? ''}
        disabled={busy}
        onChange={(event) => choose(event.target.value)}
        error={refused === '' ? undefined : refused}
      />
    </FormPart>
  );
}
