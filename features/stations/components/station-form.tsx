'use client';

import { ChoiceField } from '@/components/form/choice-field';
import { FieldFindings } from '@/components/form/field-findings';
import { FormPart, twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { Stamp } from '@/components/stamp';
import { listWords } from '@/lib/domain/plans/words';
import { meshes, stationColours, stationKinds, ticketLayouts, type Mesh, type StationColour } from '@/lib/domain/site/station';
import type { StationField } from '@/lib/domain/stations/station-differences';
import { colourWords, kindWords, layoutWords, meshWords } from '@/lib/domain/stations/station-words';
import type { StationView } from '../station-view';
import { PickOne } from './pick-one';
import { PrinterOrder } from './printer-order';
import { StampChoice } from './stamp-choice';
import type { StationForm } from './use-station-form';

type PartProps = { readonly of: StationForm };

const notesOf = (of: StationForm, field: StationField) => <FieldFindings findings={of.findings.filter((finding) => finding.subject.field === field)} fixIn={() => null} />;

function CodeNotes({ of }: PartProps) {
  const { clash, betterCode, form } = of;
  if (clash === null) return null;
  return (
    <p className="text-[12.5px] font-semibold text-hot-text">
      {clash.name} has the same {clash.letter === 1 ? 'first' : 'second'} letter, so half a stamp would not tell them apart.{' '}
      {betterCode === null ? null : <button type="button" className="min-h-6 underline underline-offset-3" onClick={() => form.setValue('code', betterCode, { shouldDirty: true, shouldValidate: true })}>Use {betterCode}</button>}
    </p>
  );
}

function WhatItIs({ of }: PartProps) {
  const { form, typed, others } = of;
  const { errors } = form.formState;
  const { mesh, colour } = typed;
  const code = typed.code || '··';
  const withMesh = (value: Mesh): string => listWords(others.filter((one) => one.mesh === value).map((one) => one.name));
  const withColour = (value: StationColour): string => listWords(others.filter((one) => one.colour === value).map((one) => one.name));
  return (
    <>
      <div className="grid grid-cols-[62px_minmax(0,1fr)_96px] items-start gap-3">
        <div className="pt-[5px]"><Stamp code={code} mesh={mesh} colour={colour} size="large" /></div>
        <TextField id="station-name" label="Name" autoFocus={of.base === null} maxLength={60} error={errors.name?.message} {...form.register('name', { onChange: (event: { readonly target: { readonly value: string } }) => of.nameTyped(event.target.value) })} />
        <TextField id="station-code" label="Code" mono maxLength={2} className="uppercase" error={errors.code?.message} {...form.register('code', { setValueAs: (text: unknown) => String(text ?? '').toUpperCase() })} />
        <div className="col-span-full grid gap-1.5 empty:hidden" aria-live="polite"><CodeNotes of={of} /></div>
      </div>
      <PickOne legend="What it does" name="kind" choices={stationKinds.map((value) => ({ value, words: kindWords[value] }))} chosen={typed.kind} choose={(value) => form.setValue('kind', value, { shouldDirty: true })} />
      <StampChoice legend="Mesh" name="mesh" values={meshes} words={meshWords} chosen={mesh} takenBy={withMesh} draw={(value) => ({ code, mesh: value, colour })} choose={(value) => form.setValue('mesh', value, { shouldDirty: true })} />
      {notesOf(of, 'mesh')}
      <StampChoice legend="Colour" name="colour" values={stationColours} words={colourWords} chosen={colour} takenBy={withColour} draw={(value) => ({ code, mesh, colour: value })} choose={(value) => form.setValue('colour', value, { shouldDirty: true })} />
    </>
  );
}

/** Every field of a station, with what the checks say of it while it is typed. */
export function StationFormFields({ of, view }: PartProps & { readonly view: StationView }) {
  const { form, typed } = of;
  const { errors } = form.formState;
  return (
    <>
      <WhatItIs of={of} />
      <FormPart title="Where its tickets come out">
        <PrinterOrder printers={view.printers} chosen={typed.printers} error={errors.printers?.message} change={(printers) => form.setValue('printers', printers, { shouldDirty: true })} />
        {notesOf(of, 'printers')}
        <div className="flex flex-wrap gap-x-6 gap-y-3">
          <PickOne legend="Ticket" name="layout" choices={ticketLayouts.map((value) => ({ value, words: layoutWords[value] }))} chosen={typed.layout} choose={(value) => form.setValue('layout', value, { shouldDirty: true })} />
          <PickOne legend="Tickets for each sending" name="ticketsPerSending" choices={['1', '2', '3'].map((value) => ({ value, words: value }))} chosen={String(typed.ticketsPerSending)} choose={(value) => form.setValue('ticketsPerSending', Number(value), { shouldDirty: true })} />
        </div>
      </FormPart>
      <FormPart title="In service">
        <PickOne legend="Now" name="open" choices={[{ value: 'open', words: 'Open' }, { value: 'closed', words: 'Closed' }]} chosen={typed.open ? 'open' : 'closed'} choose={(value) => form.setValue('open', value === 'open', { shouldDirty: true })} />
        <div className={twoColumns}>
          <ChoiceField
            id="station-stand-in" label="Stand-in" hint="Has its work while it is closed." none="Nobody" notes={notesOf(of, 'standIn')} error={errors.standIn?.message}
            choices={of.others.map((one) => ({ value: one.id, words: one.open ? one.name : `${one.name}, closed now` }))}
            {...form.register('standIn', { setValueAs: (value: unknown) => (value === '' ? null : value) })}
          />
          <TextField id="station-pace" label="Pace" hint="Items it can start in 15 minutes." inputMode="numeric" error={errors.pace?.message} {...form.register('pace', { setValueAs: (value: unknown) => (value === '' || value === null ? null : Number(value)) })} />
        </div>
      </FormPart>
    </>
  );
}
