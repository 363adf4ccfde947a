type PickOneProps<Value extends string> = {
  readonly legend: string;
  readonly name: string;
  readonly choices: readonly { readonly value: Value; readonly words: string }[];
  readonly chosen: Value;
  readonly choose: (value: Value) => void;
};

/** One of a few, all in sight. */
export function PickOne<Value extends string>({ legend, name, choices, chosen, choose }: PickOneProps<Value>) {
  return (
    <fieldset>
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">{legend}</legend>
      <div className="flex flex-wrap gap-1.5">
        {choices.map(({ value, words }) => (
          <label key={value} className="flex min-h-10 cursor-pointer items-center gap-2 rounded-md border border-line-strong bg-raised px-3 text-[13.5px] has-checked:border-ink has-checked:bg-ink has-checked:text-on-ink">
            <input type="radio" name={name} value={value} className="size-4 accent-current" checked={value === chosen} onChange={() => choose(value)} />
            {words}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
