import type { ComponentProps } from 'react';

type TickProps = Omit<ComponentProps<'input'>, 'type'> & { readonly label: string };

/** Yes or no. */
export function TickField({ label, ...input }: TickProps) {
  return (
    <label className="flex min-h-10 items-center gap-2.5 text-[14px]">
      <input type="checkbox" className="size-5 accent-ink" {...input} />
      {label}
    </label>
  );
}

type TicksProps = {
  readonly legend: string;
  readonly none?: string;
  readonly choices: readonly { readonly id: string; readonly name: string }[];
  readonly ticked: readonly string[];
  readonly change: (ticked: string[]) => void;
  readonly error?: string | undefined;
};

/** Any number of several, all in sight. */
export function TicksField({ legend, none, choices, ticked, change, error }: TicksProps) {
  return (
    <fieldset className="grid gap-1">
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">{legend}</legend>
      {choices.length === 0 ? <p className="text-[12.5px] text-quiet">{none}</p> : null}
      <div className="flex flex-wrap gap-1.5">
        {choices.map(({ id, name }) => (
          <label key={id} className="flex min-h-9 items-center gap-2 rounded-md border border-line-strong bg-raised px-2.5 text-[13.5px] has-checked:border-ink has-checked:bg-ink has-checked:text-on-ink">
            <input
              type="checkbox"
              className="size-4 accent-current"
              checked={ticked.includes(id)}
              onChange={(event) => change(event.target.checked ? [...ticked, id] : ticked.filter((other) => other !== id))}
            />
            {name}
          </label>
        ))}
      </div>
      {error === undefined ? null : <p className="text-[12.5px] font-semibold text-hot-text">{error}</p>}
    </fieldset>
  );
}
