'use client';

import { useDeferredValue, useMemo } from 'react';
import { ChoiceField } from '@/components/form/choice-field';
import { FieldFindings } from '@/components/form/field-findings';
import { FormPanel } from '@/components/form/form-panel';
import { twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { networkFindings } from '@/lib/domain/addresses/network-findings';
import type { Fix } from '@/lib/domain/findings/finding';
import { asId } from '@/lib/domain/site/ids';
import type { PrintLink } from '@/lib/domain/site/site';
import { partTitles } from '../../parts';
import type { Values } from '../../schema';
import type { PartView } from '../../view';
import { linkWords } from '../../words';
import { usePart } from '../use-part';

const linkOf = ({ kind, till, address, mask }: Values<'link'>): PrintLink =>
  (kind === 'own' ? { kind, address, mask } : kind === 'till' && till !== '' ? { kind, till: asId(till) } : { kind: 'none' });

/** Where the print link runs: the small program on site that carries bytes to printers. */
export function LinkForm({ view }: { readonly view: PartView<'link'> }) {
  const { of, leave } = usePart(view);
  const { register, setValue, formState: { errors } } = of.form;
  const typed = useDeferredValue(of.typed);
  const findings = useMemo(() => networkFindings({ ...view.site, link: linkOf(typed) }), [view.site, typed]);
  const fixIn = (fix: Fix): (() => void) | null => (fix.kind !== 'set-link-address' ? null : () => {
    setValue('address', fix.address, { shouldDirty: true });
    setValue('mask', fix.mask, { shouldDirty: true });
  });
  const notes = (field: string) => <FieldFindings findings={findings.filter((finding) => finding.subject.field === field)} fixIn={fixIn} />;
  const tills = view.site.tills.filter(({ kind }) => kind === 'fixed');
  return (
    <FormPanel title={partTitles.link} of={of} leave={leave}>
      <p className="text-[13.5px] text-soft">The small program on site that carries tickets to printers and reports how they are. Online channels reach what it reaches; without it, nothing.</p>
      <ChoiceField id="kind" label="It runs" choices={(['none', 'till', 'own'] as const).map((value) => ({ value, words: linkWords[value] }))} {...register('kind')} />
      {typed.kind === 'till' ? <ChoiceField id="till" label="Till" none="Choose one" choices={tills.map(({ id, name }) => ({ value: id, words: name }))} error={errors.till?.message} {...register('till')} /> : null}
      {typed.kind === 'own' ? (
        <div className={twoColumns}>
          <TextField id="address" label="Address" mono error={errors.address?.message} notes={notes('link.address')} {...register('address')} />
          <TextField id="mask" label="Mask" mono error={errors.mask?.message} notes={notes('link.mask')} {...register('mask')} />
        </div>
      ) : null}
    </FormPanel>
  );
}
