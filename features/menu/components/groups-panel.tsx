'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/button';
import { SidePanel } from '@/components/side-panel';
import { allergens } from '@/lib/domain/site/menu';
import { addOptionGroup, dropOptionGroup, saveOptionGroup } from '../api/menu';
import type { MenuView } from '../menu-view';
import type { OptionGroupInput } from '../schema';
import { TickList } from './tick-list';

const control = 'min-h-9 min-w-0 rounded-md border border-line-strong bg-raised px-2 text-[14px]';
const blankOption: OptionGroupInput['options'][number] = { id: null, name: '', kitchenName: '', allergens: [] };

type GroupFormProps = {
  readonly label: string;
  readonly start: OptionGroupInput;
  readonly save: (input: OptionGroupInput) => Promise<unknown>;
  readonly drop?: () => Promise<unknown>;
};

function GroupForm({ label, start, save, drop }: GroupFormProps) {
  const router = useRouter();
  const [group, setGroup] = useState(start);
  const [said, setSaid] = useState<{ readonly words: string; readonly hot: boolean } | null>(null);
  const setOption = (index: number, part: Partial<OptionGroupInput['options'][number]>): void =>
    setGroup({ ...group, options: group.options.map((option, at) => (at === index ? { ...option, ...part } : option)) });
  const act = (work: () => Promise<unknown>, done: string): void => {
    work().then(() => { setSaid({ words: done, hot: false }); router.refresh(); }, (error: unknown) => setSaid({ words: (error as Error).message, hot: true }));
  };
  return (
    <form className="grid gap-2.5 rounded-lg border border-line bg-raised p-3" onSubmit={(event) => { event.preventDefault(); act(() => save({ ...group, options: group.options.filter((option) => option.name.trim() !== '') }), 'Saved.'); }}>
      <div className="flex flex-wrap items-end gap-2">
        <label className="grid flex-1 gap-1 text-[12.5px] font-semibold text-soft">{label}<input required maxLength={120} value={group.name} onChange={(event) => setGroup({ ...group, name: event.target.value })} className={control} /></label>
        <label className="grid gap-1 text-[12.5px] font-semibold text-soft">At least<input type="number" min={0} max={50} value={group.min} onChange={(event) => setGroup({ ...group, min: Number(event.target.value) })} className={`${control} w-20`} /></label>
        <label className="grid gap-1 text-[12.5px] font-semibold text-soft">At most<input type="number" min={1} max={50} value={group.max} onChange={(event) => setGroup({ ...group, max: Number(event.target.value) })} className={`${control} w-20`} /></label>
      </div>
      <ul className="grid gap-1.5">
        {group.options.map((option, index) => (
          <li key={option.id ?? `new ${index}`} className="flex flex-wrap items-center gap-1.5">
            <input aria-label={`Option ${index + 1}`} placeholder="Option" maxLength={120} value={option.name} onChange={(event) => setOption(index, { name: event.target.value })} className={`${control} flex-1`} />
            <input aria-label={`Kitchen name of option ${index + 1}`} placeholder="Kitchen name" maxLength={120} value={option.kitchenName} onChange={(event) => setOption(index, { kitchenName: event.target.value })} className={`${control} w-32 font-mono`} />
            <div className={`${control} w-32 py-2`}><TickList label={`Allergens of option ${index + 1}`} none="No allergens" choices={allergens.map((value) => ({ value, words: value }))} chosen={option.allergens} change={(chosen) => setOption(index, { allergens: allergens.filter((one) => chosen.includes(one)) })} /></div>
            <button type="button" className="min-h-8 px-1.5 text-[12.5px] font-semibold underline underline-offset-3" aria-label={`Take out option ${index + 1}`} onClick={() => setGroup({ ...group, options: group.options.filter((_, at) => at !== index) })}>Take out</button>
          </li>
        ))}
      </ul>
      <p role="status" className={`rounded px-2 py-1 text-[13px] empty:hidden ${said?.hot === true ? 'bg-hot-tint text-hot-text' : 'bg-calm-tint text-calm-text'}`}>{said?.words}</p>
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => setGroup({ ...group, options: [...group.options, blankOption] })}>One more option</Button>
        <Button type="submit" kind="primary">Save</Button>
        {drop === undefined ? null : <Button onClick={() => act(drop, 'Deleted.')}>Delete</Button>}
      </div>
    </form>
  );
}

/** The option groups of the site, shared between items: a change is a change for all of them. */
export function GroupsPanel({ view, close }: { readonly view: MenuView; readonly close: () => void }) {
  const options = new Map(view.options.map((option) => [option.id, option]));
  return (
    <SidePanel title="Options" close={close}>
      <p className="mb-3 text-[13px] text-soft">Items share these groups: what you change here changes for every item that comes with it. A ticket is an aid: people confirm allergies by voice and by the venue’s own procedure.</p>
      <div className="grid gap-3">
        {view.groups.map((group) => (
          <GroupForm
            key={`${group.id} ${group.version}`} label="Group"
            start={{ name: group.name, min: group.min, max: group.max, options: group.options.flatMap((id) => { const option = options.get(id); return option === undefined ? [] : [{ id: option.id, name: option.name, kitchenName: option.kitchenName, allergens: [...option.allergens] }]; }) }}
            save={(input) => saveOptionGroup(view.siteId, group.id, group.version, input)} drop={() => dropOptionGroup(view.siteId, group.id, group.version)}
          />
        ))}
        <GroupForm key={`new ${view.groups.length}`} label="A new group" start={{ name: '', min: 0, max: 1, options: [blankOption, blankOption] }} save={(input) => addOptionGroup(view.siteId, input)} />
      </div>
    </SidePanel>
  );
}
