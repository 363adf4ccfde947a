'use client';

import { useFieldArray } from 'react-hook-form';
import { Button } from '@/components/button';
import { FormPanel } from '@/components/form/form-panel';
import { TextField } from '@/components/form/text-field';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { ListRow } from '../list-row';
import { usePart } from '../use-part';

/** The courses of a meal in their order. */
export function CoursesForm({ view }: { readonly view: PartView<'courses'> }) {
  const { of, leave } = usePart(view);
  const { control, register, formState: { errors } } = of.form;
  const courses = useFieldArray({ control, name: 'courses', keyName: 'key' });
  const last = courses.fields.length - 1;
  return (
    <FormPanel title={partTitles.courses} of={of} leave={leave}>
      <p className="text-[13.5px] text-soft">In the order they are served. Tickets are laid out by them, and each can be held and fired.</p>
      {courses.fields.map((row, index) => (
        <ListRow
          key={row.key}
          name={of.typed.courses[index]?.name || `line ${index + 1}`}
          remove={() => courses.remove(index)}
          move={{ up: index === 0 ? null : () => courses.swap(index, index - 1), down: index === last ? null : () => courses.swap(index, index + 1) }}
        >
          <TextField id={`courses-${index}`} label="Name" error={errors.courses?.[index]?.name?.message} {...register(`courses.${index}.name`)} />
        </ListRow>
      ))}
      <p role="alert" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{errors.courses?.message ?? errors.courses?.root?.message}</p>
      <div><Button onClick={() => courses.append({ id: '', name: '' })}>Add a course</Button></div>
    </FormPanel>
  );
}
