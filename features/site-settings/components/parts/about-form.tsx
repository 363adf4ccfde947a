'use client';

import { FormPanel } from '@/components/form/form-panel';
import { TextField } from '@/components/form/text-field';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { sayLanguage } from '../../words';
import { usePart } from '../use-part';

/** Offered in the list; any other language tag can be typed. */
const languages = ['en', 'cs', 'da', 'de', 'el', 'es', 'fi', 'fr', 'hr', 'hu', 'it', 'nb', 'nl', 'pl', 'pt', 'ro', 'sk', 'sl', 'sv', 'tr'];

export function AboutForm({ view }: { readonly view: PartView<'about'> }) {
  const { of, leave } = usePart(view);
  const { register, formState: { errors } } = of.form;
  return (
    <FormPanel title={partTitles.about} of={of} leave={leave}>
      <TextField id="name" label="Name" error={errors.name?.message} {...register('name')} />
      <TextField id="place" label="Town or quarter" hint="Shown beside the name." error={errors.place?.message} {...register('place')} />
      <TextField id="timeZone" label="Time zone" list="time-zones" hint="Services start on this clock." error={errors.timeZone?.message} {...register('timeZone')} />
      <datalist id="time-zones">{Intl.supportedValuesOf('timeZone').map((zone) => <option key={zone} value={zone} />)}</datalist>
      <TextField id="language" label="Language" list="languages" hint="The language that the menu is written in." error={errors.language?.message} {...register('language')} />
      <datalist id="languages">{languages.map((tag) => <option key={tag} value={tag}>{sayLanguage(tag)}</option>)}</datalist>
    </FormPanel>
  );
}
