'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { fieldWords, menuFields, type MenuField } from '@/lib/domain/menu-file/fields';
import { sendMenuFile } from '../api/menu';
import type { DryRun } from '../dry-run';

type ImportPanelProps = { readonly siteId: string; readonly close: () => void };

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`;

function Columns({ run, choose }: { readonly run: DryRun; readonly choose: (field: MenuField, column: number | null) => void }) {
  return (
    <fieldset className="grid gap-1.5">
      <legend className="mb-2 text-[15px] font-[660]">2. Which column is what</legend>
      {menuFields.map((field) => {
        const column = run.mapping[field];
        const sample = column === null ? '' : run.sample.map((cells) => cells[column] ?? '').filter((cell) => cell !== '').slice(0, 2).join(', ');
        return (
          <label key={field} className="grid grid-cols-[130px_minmax(0,1fr)] items-center gap-x-2 text-[13px]">
            <span className="font-semibold">{fieldWords[field]}{field === 'section' || field === 'name' ? ' (needed)' : ''}</span>
            <select value={column ?? ''} onChange={(event) => choose(field, event.target.value === '' ? null : Number(event.target.value))} className="min-h-9 min-w-0 rounded-md border border-line-strong bg-raised px-2">
              <option value="">Not in the file</option>
              {run.headings.map((heading, index) => <option key={index} value={index}>{heading === '' ? `Column ${index + 1}` : heading}</option>)}
            </select>
            {sample === '' ? null : <span className="col-start-2 truncate text-[12px] text-quiet">{sample}</span>}
          </label>
        );
      })}
    </fieldset>
  );
}

function Outcome({ run }: { readonly run: DryRun }) {
  return (
    <section className="grid gap-2" aria-live="polite">
      <h3 className="text-[15px] font-[660]">3. What would happen</h3>
      <p className="text-[19px] leading-tight font-[680]">{counted(run.creates, 'new item', 'new items')}, {run.updates} changed, {run.unchanged} as they are{run.errorCount > 0 ? <>, <span className="text-hot-text">{counted(run.errorCount, 'bad line', 'bad lines')}</span></> : null}</p>
      {run.sections.length === 0 ? null : <p className="text-[13px] text-soft">New menu sections: {run.sections.join(', ')}.</p>}
      {run.groups.length === 0 ? null : <p className="text-[13px] text-soft">New option groups: {run.groups.join(', ')}.</p>}
      {run.errors.length === 0 ? null : (
        <div className="max-h-72 overflow-auto rounded-lg border border-line bg-raised" tabIndex={0} role="region" aria-label="Bad lines">
          <table className="w-full text-left text-[12.5px]">
            <thead><tr className="text-soft"><th scope="col" className="px-2.5 py-1.5">Line</th><th scope="col" className="px-2.5 py-1.5">Column</th><th scope="col" className="px-2.5 py-1.5">Reason</th></tr></thead>
            <tbody>{run.errors.map((error, index) => <tr key={index} className="border-t border-line align-top"><td className="px-2.5 py-1.5 font-mono">{error.line}</td><td className="px-2.5 py-1.5">{error.column}</td><td className="px-2.5 py-1.5">{error.reason}</td></tr>)}</tbody>
          </table>
        </div>
      )}
      {run.errorCount > run.errors.length ? <p className="text-[12.5px] text-soft">The first {run.errors.length} are shown.</p> : null}
    </section>
  );
}

/** Brings in a file in three looks: the file, its columns, what it would do. It is applied whole or not at all. */
export function ImportPanel({ siteId, close }: ImportPanelProps) {
  const router = useRouter();
  const [file, setFile] = useState<File | null>(null);
  const [run, setRun] = useState<DryRun | null>(null);
  const [fault, setFault] = useState('');
  const [busy, setBusy] = useState(false);

  const look = async (chosen: File, query: { readonly mapping?: string; readonly apply?: string }): Promise<void> => {
    setBusy(true);
    setFault('');
    try {
      const next = await sendMenuFile(siteId, chosen, query);
      setRun(next);
      if (next.applied) router.refresh();
    } catch (error) {
      setFault((error as Error).message);
      if (query.apply === undefined) setRun(null);
    } finally {
      setBusy(false);
    }
  };
  const choose = (chosen: File | undefined): void => {
    if (chosen === undefined) return;
    setFile(chosen);
    if (chosen.size > 10_000_000) setFault('The file is larger than 10 MB, which no menu needs. Take out what is not menu, or bring it in as two files.');
    else void look(chosen, {});
  };
  const map = (field: MenuField, column: number | null): void => {
    if (file !== null && run !== null) void look(file, { mapping: JSON.stringify({ ...run.mapping, [field]: column }) });
  };
  const ready = run !== null && run.errorCount === 0 && run.creates + run.updates > 0 && run.mapping.section !== null && run.mapping.name !== null;
  if (run?.applied === true) {
    return (
      <SidePanel title="Bring in a file" close={close}>
        <p role="status" className="rounded-lg bg-calm-tint p-4 text-[17px] font-[640] text-calm-text">{counted(run.creates, 'item is', 'items are')} new and {run.updates} changed. Hang new sections on their stations next.</p>
        <Button kind="primary" className="mt-4" onClick={close}>Done</Button>
      </SidePanel>
    );
  }
  return (
    <SidePanel title="Bring in a file" close={close}>
      <div className="grid gap-6">
        <section className="grid gap-2">
          <h3 className="text-[15px] font-[660]">1. The file</h3>
          <p className="text-[13px] text-soft">A table saved as CSV, by a spreadsheet or the ordering software: one line an item, with headings. Commas, semicolons and tabs are all read.</p>
          <label className="grid gap-1 rounded-lg border-[1.5px] border-dashed border-line-strong p-4 text-[13.5px] font-semibold">Choose the file
            <input type="file" accept=".csv,.txt,.tsv,text/csv,text/plain" onChange={(event) => choose(event.target.files?.[0])} className="text-[13px] font-normal" />
          </label>
        </section>
        <p role="alert" className="rounded-lg bg-hot-tint px-3 py-2 text-hot-text empty:hidden">{fault}</p>
        {busy ? <p role="status" className="text-soft">Reading the file</p> : null}
        {run === null ? null : <><Columns run={run} choose={map} /><Outcome run={run} /></>}
        {run === null || file === null ? null : (
          <div className="grid gap-2">
            <Button kind="primary" disabled={!ready || busy} onClick={() => void look(file, { mapping: JSON.stringify(run.mapping), apply: run.digest })}>Bring in {counted(run.creates + run.updates, 'item', 'items')}</Button>
            <p className="text-[12.5px] text-quiet">{run.errorCount > 0 ? 'Mend the bad lines in the file, then choose it again. Until then nothing is brought in.' : 'All of it is brought in at once, or nothing.'}</p>
          </div>
        )}
      </div>
    </SidePanel>
  );
}
