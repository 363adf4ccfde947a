'use client';

import { useFieldArray } from 'react-hook-form';
import { Button } from '@/components/button';
import { ChoiceField } from '@/components/form/choice-field';
import { FormPanel } from '@/components/form/form-panel';
import { twoColumns } from '@/components/form/form-part';
import { TextField } from '@/components/form/text-field';
import { sharedPointKinds } from '@/lib/domain/site/site';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { sharedPointWords } from '../../words';
import { ListRow } from '../list-row';
import { usePart } from '../use-part';

const kinds = sharedPointKinds.map((value) => ({ value, words: sharedPointWords[value] }));

/** What several devices hang on; what hangs on each is said at the printer or till. */
export function SharedPointsForm({ view }: { readonly view: PartView<'shared-points'> }) {
  const { of, leave } = usePart(view);
  const { control, register, formState: { errors } } = of.form;
  const points = useFieldArray({ control, name: 'points', keyName: 'key' });
  const hanging = (id: string): number => [...view.site.printers, ...view.site.tills].filter(({ sharedPoints }) => sharedPoints.some((point) => point === id)).length;
  return (
    <FormPanel title={partTitles['shared-points']} of={of} leave={leave}>
      <p className="text-[13.5px] text-soft">One loose plug here stops everything that hangs on it. Say at each printer and till what it hangs on.</p>
      {points.fields.map((row, index) => (
        <ListRow key={row.key} name={of.typed.points[index]?.name || `line ${index + 1}`} remove={() => points.remove(index)}>
          <div className={twoColumns}>
            <TextField
              id={`points-${index}-name`}
              label="Name"
              placeholder="Switch under the bar"
              {...(row.id === '' || hanging(row.id) === 0 ? {} : { hint: `${hanging(row.id)} ${hanging(row.id) === 1 ? 'device hangs' : 'devices hang'} on it.` })}
              error={errors.points?.[index]?.name?.message}
              {...register(`points.${index}.name`)}
            />
            <ChoiceField id={`points-${index}-kind`} label="Kind" choices={kinds} {...register(`points.${index}.kind`)} />
          </div>
        </ListRow>
      ))}
      <div><Button onClick={() => points.append({ id: '', name: '', kind: 'switch' })}>Add a shared point</Button></div>
    </FormPanel>
  );
}
