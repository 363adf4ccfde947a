'use client';

import { useFieldArray } from 'react-hook-form';
import { Button } from '@/components/button';
import { ChoiceField } from '@/components/form/choice-field';
import { FormPanel } from '@/components/form/form-panel';
import { twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { contactKinds } from '@/lib/domain/site/site';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { contactWords } from '../../words';
import { ListRow } from '../list-row';
import { usePart } from '../use-part';

const kinds = contactKinds.map((value) => ({ value, words: contactWords[value] }));

/** Whom to call when a printer, the network or a socket gives trouble. */
export function ContactsForm({ view }: { readonly view: PartView<'contacts'> }) {
  const { of, leave } = usePart(view);
  const { control, register, formState: { errors } } = of.form;
  const contacts = useFieldArray({ control, name: 'contacts', keyName: 'key' });
  return (
    <FormPanel title={partTitles.contacts} of={of} leave={leave}>
      <p className="text-[13.5px] text-soft">Whom to call. Mains, network cabling and anything above a hot line or near water is for a licensed electrician.</p>
      {contacts.fields.map((row, index) => {
        const reasons = errors.contacts?.[index];
        return (
          <ListRow key={row.key} name={of.typed.contacts[index]?.name || `line ${index + 1}`} remove={() => contacts.remove(index)}>
            <div className={twoColumns}>
              <TextField id={`contacts-${index}-name`} label="Name" error={reasons?.name?.message} {...register(`contacts.${index}.name`)} />
              <ChoiceField id={`contacts-${index}-kind`} label="For" choices={kinds} {...register(`contacts.${index}.kind`)} />
              <TextField id={`contacts-${index}-phone`} label="Phone" type="tel" error={reasons?.phone?.message} {...register(`contacts.${index}.phone`)} />
              <TextField id={`contacts-${index}-email`} label="E-mail" type="email" error={reasons?.email?.message} {...register(`contacts.${index}.email`)} />
            </div>
          </ListRow>
        );
      })}
      <div><Button onClick={() => contacts.append({ kind: 'installer', name: '', phone: '', email: '' })}>Add a contact</Button></div>
    </FormPanel>
  );
}
