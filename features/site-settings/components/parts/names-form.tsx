'use client';

import { FormPanel } from '@/components/form/form-panel';
import { twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { TickField } from '@/components/form/tick-field';
import { longestNameBytes } from '@/lib/domain/names/name-limits';
import { policyBreaches, sayPolicy } from '@/lib/domain/names/naming-policy';
import { partTitles } from '../../parts';
import { namingInput } from '../../schema';
import type { PartView } from '../../view';
import { usePart } from '../use-part';

/** What a good printer name is here, with those that would be outside it. */
export function NamesForm({ view }: { readonly view: PartView<'names'> }) {
  const { of, leave } = usePart(view);
  const { register, formState: { errors } } = of.form;
  const policy = namingInput.safeParse(of.typed).data ?? view.values;
  const outside = view.site.printers.filter(({ name }) => policyBreaches(policy, name).length > 0).map(({ name }) => name);
  return (
    <FormPanel title={partTitles.names} of={of} leave={leave}>
      <p className="text-[13.5px] text-soft">The printer name is typed by hand on every till, so it is short and has no spaces. Names outside what you say here are shown as something to look at.</p>
      <div className={twoColumns}>
        <TextField id="minLength" label="Shortest" type="number" min={1} max={longestNameBytes} error={errors.minLength?.message} {...register('minLength', { valueAsNumber: true })} />
        <TextField id="maxLength" label="Longest" type="number" min={1} max={longestNameBytes} error={errors.maxLength?.message} {...register('maxLength', { valueAsNumber: true })} />
      </div>
      <TickField label="Hyphens are fine" {...register('allowHyphen')} />
      <TickField label="Underscores are fine" {...register('allowUnderscore')} />
      <TickField label="Starts with a letter" {...register('mustStartWithLetter')} />
      <p role="status" className="rounded-md bg-ground px-3 py-2 text-[13.5px]">
        A good name has {sayPolicy(policy)}. {outside.length === 0 ? 'All names of this site are inside it.' : `Outside it: ${outside.join(', ')}.`}
      </p>
    </FormPanel>
  );
}
