'use client';

import { FormPanel } from '@/components/form/form-panel';
import { followModes } from '@/lib/domain/site/site';
import { partTitles } from '../../parts';
import type { PartView } from '../../view';
import { followMeanings, followWords } from '../../words';
import { usePart } from '../use-part';

/** How a change on a screen comes to count on the tills. */
export function FollowForm({ view }: { readonly view: PartView<'follow'> }) {
  const { of, leave } = usePart(view);
  return (
    <FormPanel title={partTitles.follow} of={of} leave={leave}>
      <fieldset className="grid gap-1.5">
        <legend className="mb-1 text-[12.5px] font-semibold text-soft">A plan on a screen prints nothing by itself</legend>
        {followModes.map((mode) => (
          <label key={mode} className="flex items-start gap-2.5 rounded-md border border-line-strong bg-raised px-3 py-2 has-checked:border-ink has-checked:outline-1 has-checked:outline-ink">
            <input type="radio" value={mode} className="mt-0.5 size-4 accent-ink" {...of.form.register('follows')} />
            <span className="text-[14px]"><b className="block font-semibold">{followWords[mode]}</b><span className="text-[12.5px] text-soft">{followMeanings[mode]}</span></span>
          </label>
        ))}
      </fieldset>
      {of.typed.follows === 'through-link' && view.site.link.kind === 'none' ? <p role="status" className="rounded-md bg-look-tint px-3 py-2 text-[13.5px] text-look-text">This site has no print link yet. Say where it runs as well.</p> : null}
    </FormPanel>
  );
}
