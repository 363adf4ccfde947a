'use client';

import { useWatch } from 'react-hook-form';
import { FormPart, twoColumns } from '@/components/form/form-part';
import { TickField, TicksField } from '@/components/form/tick-field';
import { codePageWords, connectionWords, emphasisWords, stageWords, usualColumns } from '@/lib/domain/devices/printer-words';
import { codePages, connections, emphases, printerStages, rollWidthsMm, type RollWidthMm } from '@/lib/domain/site/printer';
import type { PanelView } from '../panel-view';
import { BoundChoice, BoundText } from './printer-fields';
import type { PrinterForm } from './use-printer-form';

type PartProps = { readonly of: PrinterForm; readonly view: PanelView };

const wordsOf = <Value extends string>(values: readonly Value[], words: Readonly<Record<Value, string>>) => values.map((value) => ({ value, words: words[value] }));

function WhereItIs({ of, view }: PartProps) {
  const connection = useWatch({ control: of.form.control, name: 'connection' });
  return (
    <FormPart title="Where it is">
      <BoundChoice of={of} name="connection" choices={wordsOf(connections, connectionWords)} />
      {connection === 'network' ? (
        <div className={twoColumns}>
          <BoundText of={of} name="address" mono />
          <BoundText of={of} name="mask" mono />
          <BoundText of={of} name="gateway" mono />
          <BoundText of={of} name="port" mono number />
        </div>
      ) : (
        <BoundChoice of={of} name="hostTill" none="Not said yet" choices={view.site.tills.filter((till) => till.kind !== 'online').map((till) => ({ value: till.id, words: till.name }))} />
      )}
      <div className={twoColumns}>
        <BoundText of={of} name="mac" mono hint="On the sticker and on the self-test." />
        <BoundText of={of} name="presentAddress" mono hint="Until it has been given the address above." />
      </div>
    </FormPart>
  );
}

function Paper({ of }: { readonly of: PrinterForm }) {
  const { form } = of;
  const width = useWatch({ control: form.control, name: 'rollWidthMm' });
  const changeWidth = (next: RollWidthMm): void => {
    if (form.getValues('columns') === usualColumns[width]) form.setValue('columns', usualColumns[next], { shouldDirty: true });
    form.setValue('rollWidthMm', next, { shouldDirty: true });
  };
  return (
    <FormPart title="Paper">
      <fieldset>
        <legend className="mb-1 text-[12.5px] font-semibold text-soft">Roll</legend>
        <div className="flex gap-1.5">
          {rollWidthsMm.map((each) => (
            <label key={each} className="flex min-h-10 items-center gap-2 rounded-md border border-line-strong bg-raised px-3 has-checked:border-ink has-checked:bg-ink has-checked:text-on-ink">
              <input type="radio" name="rollWidthMm" className="size-4 accent-current" checked={width === each} onChange={() => changeWidth(each)} />
              {each} mm
            </label>
          ))}
        </div>
      </fieldset>
      <div className={twoColumns}>
        <BoundText of={of} name="columns" number hint={`Usual for ${width} mm: ${usualColumns[width]}.`} />
        <BoundChoice of={of} name="codePage" choices={wordsOf(codePages, codePageWords)} />
      </div>
      <BoundChoice of={of} name="emphasis" choices={wordsOf(emphases, emphasisWords)} hint="On paper this means an allergy and nothing else." />
      <div className="flex flex-wrap gap-x-6">
        <TickField label="Cuts the paper" {...form.register('cutter')} />
        <TickField label="Has a buzzer" {...form.register('buzzer')} />
        <TickField label="One ticket for all its stations" {...form.register('joinsStations')} />
      </div>
    </FormPart>
  );
}

/** Every field of a printer, with what the checks say of it while it is typed. */
export function PrinterFormFields({ of, view }: PartProps) {
  const points = useWatch({ control: of.form.control, name: 'sharedPoints' });
  const others = view.site.printers.filter((printer) => printer.id !== of.base?.id);
  return (
    <>
      <BoundText of={of} name="name" mono hint="How every till knows it. Short, no spaces, the same everywhere." />
      <WhereItIs of={of} view={view} />
      <Paper of={of} />
      <FormPart title="When it stops">
        <BoundChoice of={of} name="backup" none="No backup" choices={others.map((printer) => ({ value: printer.id, words: printer.name }))} />
        <TicksField
          legend="Hangs on"
          none="No switches or power strips are written down for this site."
          choices={view.sharedPoints}
          ticked={points}
          change={(ticked) => of.form.setValue('sharedPoints', ticked, { shouldDirty: true })}
          error={of.form.formState.errors.sharedPoints?.message}
        />
      </FormPart>
      <FormPart title="The device">
        <div className={twoColumns}>
          <BoundText of={of} name="model" />
          <BoundText of={of} name="serial" mono />
        </div>
        <BoundChoice of={of} name="stage" choices={wordsOf(printerStages, stageWords)} />
      </FormPart>
    </>
  );
}
