import { Stamp } from '@/components/stamp';
import type { Mesh, StationColour } from '@/lib/domain/site/station';

type StampChoiceProps<Value extends string> = {
  readonly legend: string;
  readonly name: string;
  readonly values: readonly Value[];
  readonly words: Readonly<Record<Value, string>>;
  readonly chosen: Value;
  /** Which stations have a value already, in words; empty when none has. */
  readonly takenBy: (value: Value) => string;
  readonly draw: (value: Value) => { readonly code: string; readonly mesh: Mesh; readonly colour: StationColour };
  readonly choose: (value: Value) => void;
};

/** Chooses a mesh or a colour by the stamp it makes; what another station has is dimmed and says whose it is. */
export function StampChoice<Value extends string>({ legend, name, values, words, chosen, takenBy, draw, choose }: StampChoiceProps<Value>) {
  const owner = takenBy(chosen);
  return (
    <fieldset className="grid gap-1">
      <legend className="mb-1 text-[12.5px] text-soft"><span className="font-semibold">{legend}:</span> {words[chosen].toLowerCase()}{owner === '' ? '' : `, as ${owner}`}</legend>
      <div className="flex flex-wrap gap-x-1.5 gap-y-1">
        {values.map((value) => {
          const taken = takenBy(value);
          return (
            <label key={value} title={taken === '' ? words[value] : `${words[value]}: ${taken}`} className="cursor-pointer rounded-[9px] border-2 border-transparent p-[3px] hover:border-line-strong has-checked:border-ink has-focus-visible:outline-2 has-focus-visible:outline-offset-1 has-focus-visible:outline-ink">
              <input type="radio" name={name} value={value} checked={value === chosen} onChange={() => choose(value)} className="sr-only" />
              <span className={taken === '' || value === chosen ? '' : 'opacity-40'}><Stamp {...draw(value)} size="small" /></span>
              <span className="sr-only">{words[value]}{taken === '' ? '' : `, ${taken} has it`}</span>
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
