'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { Button } from '@/components/button';
import { FormPart } from '@/components/form/form-part';
import { controlClass } from '@/components/form/field';
import type { PanelView } from '../panel-view';
import { queueFor } from '../till-form-values';
import { newTillId } from '../till-of-input';
import { QueueRow } from './queue-row';
import type { TillForm } from './use-till-form';

/** The printers installed on a till, as found there; a new row comes as it should be. */
export function QueueList({ of, view }: { readonly of: TillForm; readonly view: PanelView }) {
  const { control, formState } = of.form;
  const { fields, append, remove } = useFieldArray({ control, name: 'queues' });
  const queues = useWatch({ control, name: 'queues' });
  const tillId = of.base?.id ?? newTillId;
  const missing = view.site.printers.filter((printer) => !queues.some((queue) => queue.printer === printer.id));
  const direct = missing.filter((printer) => printer.connection === 'network' || printer.hostTill === tillId);
  const add = (ids: readonly string[]): void => append(missing.filter((printer) => ids.includes(printer.id)).map((printer) => queueFor(printer, tillId)));
  const error = formState.errors.queues?.root?.message ?? formState.errors.queues?.message;
  return (
    <FormPart title="Printers installed on it">
      {fields.length === 0 ? <p className="text-[13px] text-soft">None yet. Write down each printer as the till shows it, or add those it should have.</p> : null}
      {fields.map((field, index) => {
        const queue = queues[index];
        return queue === undefined ? null : <QueueRow key={field.id} of={of} view={view} index={index} queue={queue} remove={() => remove(index)} />;
      })}
      {error === undefined ? null : <p className="text-[12.5px] font-semibold text-hot-text">{error}</p>}
      {missing.length === 0 ? null : (
        <div className="flex flex-wrap items-end gap-2">
          <label className="grid gap-1 text-[12.5px] font-semibold text-soft">
            Add a printer
            <select className={controlClass} value="" onChange={(event) => add([event.target.value])}>
              <option value="">Choose one</option>
              {missing.map((printer) => <option key={printer.id} value={printer.id}>{printer.name}</option>)}
            </select>
          </label>
          {direct.length < 2 ? null : <Button onClick={() => add(direct.map((printer) => printer.id))}>Add all {direct.length} it can print on</Button>}
        </div>
      )}
    </FormPart>
  );
}
