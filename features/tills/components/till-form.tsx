'use client';

import { useWatch } from 'react-hook-form';
import { FormPart, twoColumns } from '@/components/form/form-part';
import { TicksField } from '@/components/form/tick-field';
import { kindWords, orderTypeLabels, sourceWords, systemWords } from '@/lib/domain/devices/till-words';
import { orderTypes, type OrderType } from '@/lib/domain/site/order-types';
import { addressSources, tillKinds, tillSystems } from '@/lib/domain/site/till';
import type { PanelView } from '../panel-view';
import { QueueList } from './queue-list';
import { BoundChoice, BoundText } from './till-fields';
import type { TillForm } from './use-till-form';

type PartProps = { readonly of: TillForm; readonly view: PanelView };

const wordsOf = <Value extends string>(values: readonly Value[], words: Readonly<Record<Value, string>>) => values.map((value) => ({ value, words: words[value] }));
const named = (rows: readonly { readonly id: string; readonly name: string }[]) => rows.map((row) => ({ value: row.id, words: row.name }));

function OnTheNetwork({ of, view }: PartProps) {
  const points = useWatch({ control: of.form.control, name: 'sharedPoints' });
  return (
    <FormPart title="On the network">
      <div className={twoColumns}>
        <BoundChoice of={of} name="addressSource" choices={wordsOf(addressSources, sourceWords)} />
        <BoundText of={of} name="adapter" hint="As the till's system shows it." />
        <BoundText of={of} name="address" mono />
        <BoundText of={of} name="mask" mono />
      </div>
      <TicksField
        legend="Hangs on"
        none="No switches or power strips are written down for this site."
        choices={view.sharedPoints}
        ticked={points}
        change={(ticked) => of.form.setValue('sharedPoints', ticked, { shouldDirty: true })}
        error={of.form.formState.errors.sharedPoints?.message}
      />
    </FormPart>
  );
}

/** Every field of a till, with what the checks say of it while it is typed. */
export function TillFormFields({ of, view }: PartProps) {
  const { control, formState, setValue } = of.form;
  const [kind, types] = useWatch({ control, name: ['kind', 'orderTypes'] });
  const others = view.site.tills.filter((till) => till.id !== of.base?.id && till.kind !== 'online');
  return (
    <>
      <BoundText of={of} name="name" />
      <div className={twoColumns}>
        <BoundChoice of={of} name="kind" choices={wordsOf(tillKinds, kindWords)} />
        <BoundChoice of={of} name="area" choices={named(view.areas)} />
      </div>
      <TicksField
        legend="Sends orders"
        choices={orderTypes.map((id) => ({ id, name: orderTypeLabels[id] }))}
        ticked={types}
        change={(ticked) => setValue('orderTypes', ticked as OrderType[], { shouldDirty: true, shouldValidate: true })}
        error={formState.errors.orderTypes?.message}
      />
      {kind === 'online' ? <p className="text-[13px] text-soft">An online channel sends through the print link. It has no address and no printers of its own.</p> : (
        <>
          <div className={twoColumns}>
            <BoundChoice of={of} name="system" choices={wordsOf(tillSystems, systemWords)} />
            <BoundChoice of={of} name="printsThrough" none="By itself" choices={named(others)} />
          </div>
          <OnTheNetwork of={of} view={view} />
          <BoundChoice of={of} name="defaultPrinter" none="None, or one in the office" choices={named(view.site.printers)} hint="What its system prints on when nobody chooses." />
          <QueueList of={of} view={view} />
        </>
      )}
    </>
  );
}
