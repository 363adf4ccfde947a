'use client';

import { useDeferredValue, useMemo } from 'react';
import { useFieldArray } from 'react-hook-form';
import { Button } from '@/components/button';
import { FieldFindings } from '@/components/form/field-findings';
import { FormPanel } from '@/components/form/form-panel';
import { FormPart, twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { networkFindings } from '@/lib/domain/addresses/network-findings';
import type { Fix } from '@/lib/domain/findings/finding';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { ListRow } from '../list-row';
import { usePart } from '../use-part';

/** Addresses of the site, checked while they are typed. */
export function NetworkForm({ view }: { readonly view: PartView<'network'> }) {
  const { of, leave } = usePart(view);
  const { control, register, setValue, formState: { errors } } = of.form;
  const reserved = useFieldArray({ control, name: 'reserved', keyName: 'key' });
  const typed = useDeferredValue(of.typed);
  const findings = useMemo(() => networkFindings({ ...view.site, network: typed }), [view.site, typed]);

  const fixIn = (fix: Fix): (() => void) | null => (fix.kind !== 'set-network' ? null : () => {
    for (const [field, value] of Object.entries(fix.change)) setValue(field as keyof typeof fix.change, value ?? '', { shouldDirty: true, shouldValidate: true });
  });
  const notes = (field: string) => <FieldFindings findings={findings.filter((finding) => finding.subject.field === field)} fixIn={fixIn} />;

  return (
    <FormPanel title={partTitles.network} of={of} leave={leave}>
      <div className={twoColumns}>
        <TextField id="subnet" label="Network" mono placeholder="10.20.30.0/24" error={errors.subnet?.message} notes={notes('subnet')} {...register('subnet')} />
        <TextField id="gateway" label="Router" mono placeholder="10.20.30.1" error={errors.gateway?.message} notes={notes('gateway')} {...register('gateway')} />
        <TextField id="poolFrom" label="Router hands out from" mono error={errors.poolFrom?.message} notes={notes('poolFrom')} {...register('poolFrom')} />
        <TextField id="poolTo" label="to" mono error={errors.poolTo?.message} notes={notes('poolTo')} {...register('poolTo')} />
      </div>
      <p className="text-[12.5px] text-quiet">All of it stands on the router&rsquo;s own page. Leave both ends empty when it hands out no addresses.</p>
      <FormPart title="Reserved addresses">
        <p className="text-[12.5px] text-quiet">Nothing new is given one of these. A printer or till inside what the router hands out needs a line here and in the router.</p>
        {reserved.fields.map((row, index) => (
          <ListRow key={row.key} name={typed.reserved[index]?.address || `line ${index + 1}`} remove={() => reserved.remove(index)}>
            <div className={twoColumns}>
              <TextField id={`reserved-${index}-address`} label="Address" mono error={errors.reserved?.[index]?.address?.message} notes={notes(`reserved.${index}.address`)} {...register(`reserved.${index}.address`)} />
              <TextField id={`reserved-${index}-reason`} label="For" placeholder="Office printer" error={errors.reserved?.[index]?.reason?.message} {...register(`reserved.${index}.reason`)} />
            </div>
          </ListRow>
        ))}
        <div><Button onClick={() => reserved.append({ address: '', reason: '' })}>Reserve an address</Button></div>
      </FormPart>
    </FormPanel>
  );
}
