'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { usePathname, useRouter } from 'next/navigation';
import { useState } from 'react';
import { Controller, useForm, useWatch, type FieldPath } from 'react-hook-form';
import { Button } from '@/components/button';
import { ChoiceField } from '@/components/form/choice-field';
import { ConflictNotice } from '@/components/form/conflict-notice';
import { FormPart, twoColumns } from '@/components/form/form-part';
import { LeaveGuard } from '@/components/form/leave-guard';
import { TakeOffList } from '@/components/form/take-off-list';
import { TextField } from '@/components/form/text-field';
import { TickField } from '@/components/form/tick-field';
import { SidePanel } from '@/components/side-panel';
import { meshes, stationColours, stationKinds, ticketLayouts } from '@/lib/domain/site/station';
import { codeClash, suggestCode } from '@/lib/domain/stations/codes';
import { ProblemError } from '@/lib/http/client';
import { addStation, dropStation, saveStation } from '../api/stations';
import { stationInput, type StationInput } from '../schema';
import { colourWords, inputOfStation, kindWords, layoutWords, meshWords, newStationInput, type StationView } from '../station-view';
import { PrinterOrder } from './printer-order';
import { StampChoice } from './stamp-choice';

type PanelProps = { readonly view: StationView; readonly mayWrite: boolean };

const choicesOf = <Value extends string>(values: readonly Value[], words: Readonly<Record<Value, string>>) => values.map((value) => ({ value, words: words[value] }));

/** One station in the panel at the side. What is typed stays when it is refused, with the reason on its field. */
export function StationPanel({ view, mayWrite }: PanelProps) {
  const router = useRouter();
  const pathname = usePathname();
  const { station, others } = view;
  const [base, setBase] = useState(station);
  const [guarded, setGuarded] = useState(false);
  const [refused, setRefused] = useState<{ readonly words: string; readonly stale: boolean } | null>(null);
  const form = useForm<StationInput>({ resolver: zodResolver(stationInput), defaultValues: station === null ? newStationInput(others) : inputOfStation(station), mode: 'onTouched', disabled: !mayWrite });
  const { register, control, formState, setValue, setError } = form;
  const [code, mesh, colour, name, kind] = useWatch({ control, name: ['code', 'mesh', 'colour', 'name', 'kind'] });
  const clash = codeClash(code, others);
  const better = clash === null ? null : suggestCode(name, others);
  const leave = (): void => router.push(pathname, { scroll: false });
  const close = (): void => (formState.isDirty ? setGuarded(true) : leave());

  const refuse = (error: unknown): void => {
    if (!(error instanceof ProblemError)) throw error;
    for (const { field, reason } of error.problem.fields ?? []) setError(field as FieldPath<StationInput>, { message: reason });
    setRefused({ words: error.problem.detail, stale: error.problem.code === 'stale' });
    if (error.problem.code === 'stale') router.refresh();
  };
  const saveFrom = (from: typeof base) => form.handleSubmit(async (input) => {
    setRefused(null);
    try {
      await (from === null ? addStation(view.siteId, input) : saveStation(view.siteId, from.id, from.version, input));
      leave();
      router.refresh();
    } catch (error) {
      refuse(error);
    }
  });
  const takeTheirs = (): void => {
    if (station !== null) form.reset(inputOfStation(station));
    setBase(station);
    setRefused(null);
  };
  const takeOff = (): void => {
    if (base === null) return;
    dropStation(view.siteId, base.id, base.version).then(() => { leave(); router.refresh(); }, refuse);
  };

  return (
    <SidePanel title={station?.name ?? 'Add a station'} close={close}>
      <div className="grid gap-4">
        {guarded ? <LeaveGuard stay={() => setGuarded(false)} leave={leave} /> : null}
        <form noValidate onSubmit={(event) => void saveFrom(base)(event)} className="grid gap-4">
          <FormPart title="What it is">
            <TextField id="name" label="Name" error={formState.errors.name?.message} {...register('name')} />
            <div className={twoColumns}>
              <TextField
                id="code" label="Code" mono maxLength={2} hint="Two letters, for stamps and tickets." error={formState.errors.code?.message} {...register('code', { setValueAs: (text: string) => text.toUpperCase() })}
                notes={clash === null ? null : (
                  <p className="text-[12.5px] font-semibold text-hot-text">Has the same {clash.letter === 1 ? 'first' : 'second'} letter as {clash.name}. {better === null ? '' : <button type="button" className="underline underline-offset-3" onClick={() => setValue('code', better, { shouldDirty: true, shouldValidate: true })}>Use {better}</button>}</p>
                )}
              />
              <ChoiceField id="kind" label="What it does" choices={choicesOf(stationKinds, kindWords)} error={formState.errors.kind?.message} {...register('kind')} />
            </div>
            <StampChoice legend="Mesh" name="mesh" values={meshes} words={meshWords} chosen={mesh} disabled={!mayWrite} draw={(value) => ({ code, mesh: value, colour })} choose={(value) => setValue('mesh', value, { shouldDirty: true })} />
            <StampChoice legend="Colour" name="colour" values={stationColours} words={colourWords} chosen={colour} disabled={!mayWrite} draw={(value) => ({ code, mesh, colour: value })} choose={(value) => setValue('colour', value, { shouldDirty: true })} />
          </FormPart>
          <FormPart title="Where its tickets come out">
            <Controller control={control} name="printers" render={({ field }) => <PrinterOrder printers={view.printers} chosen={field.value} disabled={!mayWrite} change={(value) => setValue('printers', [...value], { shouldDirty: true })} />} />
            <div className={twoColumns}>
              <ChoiceField id="layout" label="Ticket" choices={choicesOf(ticketLayouts, layoutWords)} {...register('layout')} />
              <ChoiceField id="ticketsPerSending" label="Tickets for each sending" choices={['1', '2', '3'].map((value) => ({ value, words: value }))} {...register('ticketsPerSending', { valueAsNumber: true })} />
            </div>
          </FormPart>
          <FormPart title="In service">
            <TickField id="open" label="Open; while it is closed its stand-in takes over" {...register('open')} />
            <div className={twoColumns}>
              <ChoiceField id="standIn" label="Stand-in when it is closed" none="Nobody" choices={others.filter((one) => one.kind === kind || one.kind === 'prep').map((one) => ({ value: one.id, words: one.name }))} error={formState.errors.standIn?.message} {...register('standIn', { setValueAs: (value: string | null) => (value === '' ? null : value) })} />
              <TextField id="pace" label="Items it can start in 15 minutes" inputMode="numeric" error={formState.errors.pace?.message} {...register('pace', { setValueAs: (value: unknown) => (value === '' || value === null ? null : Number(value)) })} />
            </div>
          </FormPart>
          {refused?.stale === true ? <ConflictNotice words={refused.words} differences={[]} keepMine={() => { setBase(station); void saveFrom(station)(); }} takeTheirs={takeTheirs} />
            : refused === null ? null : <p role="alert" className="text-[13.5px] font-semibold text-hot-text">{refused.words}</p>}
          {mayWrite ? (
            <div className="sticky bottom-0 flex gap-2 border-t border-line bg-panel py-3">
              <Button type="submit" kind="primary" disabled={formState.isSubmitting}>{base === null ? 'Add it' : 'Save'}</Button>
              <Button onClick={close}>Cancel</Button>
            </div>
          ) : null}
        </form>
        {mayWrite && station !== null ? (
          <TakeOffList
            name={station.name} busy={formState.isSubmitting} takeOff={takeOff}
            obstacles={view.usedBy.length === 0 ? [] : [`Rules of ${view.usedBy.join(', ')} send dishes there. Send them elsewhere on the board first.`]}
            consequences={others.filter((one) => one.standIn === station.id).map((one) => `${one.name} loses its stand-in.`)}
          />
        ) : null}
      </div>
    </SidePanel>
  );
}
