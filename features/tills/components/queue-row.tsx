'use client';

import { ChoiceField } from '@/components/form/choice-field';
import { FieldFindings } from '@/components/form/field-findings';
import { TextField } from '@/components/form/text-field';
import { twoColumns } from '@/components/form/form-part';
import { sayInstant } from '@/lib/domain/devices/say-instant';
import { portWords } from '@/lib/domain/devices/till-words';
import { portKinds } from '@/lib/domain/site/till';
import type { PanelView } from '../panel-view';
import type { QueueDraft } from '../till-form-values';
import type { TillForm } from './use-till-form';

const quiet = 'min-h-9 text-[13px] font-semibold underline underline-offset-3';

type QueueRowProps = { readonly of: TillForm; readonly view: PanelView; readonly index: number; readonly queue: QueueDraft; readonly remove: () => void };

/** One printer as it is installed on this till, letter for letter. */
export function QueueRow({ of, view, index, queue, remove }: QueueRowProps) {
  const { form } = of;
  const name = view.site.printers.find((printer) => printer.id === queue.printer)?.name ?? 'A printer that is gone';
  const errors = form.formState.errors.queues?.[index];
  const notes = (field: string) => <FieldFindings findings={of.findingsOf(`queues.${index}.${field}`)} fixIn={of.fixIn} />;
  const setTest = (printed: boolean): void => form.setValue(`queues.${index}.testPrintedAt`, printed ? new Date().toISOString() : null, { shouldDirty: true });
  /** A test says nothing of another port. */
  const forgetTest = (): void => setTest(false);
  return (
    <fieldset className="grid gap-2 rounded-md border border-line bg-raised p-3">
      <legend className="float-left font-mono text-[14px] font-semibold">{name}</legend>
      <div className={twoColumns}>
        <TextField id={`queue-${index}-name`} label="Typed as" mono error={errors?.typedName?.message} notes={notes('typedName')} {...form.register(`queues.${index}.typedName`)} />
        <ChoiceField
          id={`queue-${index}-kind`}
          label="Port"
          choices={portKinds.map((kind) => ({ value: kind, words: portWords[kind] }))}
          notes={notes('portKind')}
          {...form.register(`queues.${index}.portKind`, { onChange: forgetTest })}
        />
      </div>
      <TextField id={`queue-${index}-port`} label="Port as the till shows it" mono error={errors?.portAddress?.message} notes={notes('portAddress')} {...form.register(`queues.${index}.portAddress`, { onChange: forgetTest })} />
      <div className="flex flex-wrap items-center gap-x-4 text-[13px]">
        <span className={queue.testPrintedAt === null ? 'text-soft' : 'text-calm-text'}>{queue.testPrintedAt === null ? 'Test to do' : `Test printed ${sayInstant(queue.testPrintedAt, view.timeZone)}`}</span>
        <button type="button" className={quiet} onClick={() => setTest(queue.testPrintedAt === null)} aria-label={queue.testPrintedAt === null ? `A test printed on ${name}` : `The test on ${name} no longer counts`}>
          {queue.testPrintedAt === null ? 'It printed' : 'Take back'}
        </button>
        <button type="button" className={`${quiet} ml-auto`} onClick={remove} aria-label={`${name} is not on this till`}>Not on this till</button>
      </div>
    </fieldset>
  );
}
