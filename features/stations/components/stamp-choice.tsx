import { Stamp } from '@/components/stamp';
import type { Mesh, StationColour } from '@/lib/domain/site/station';

type StampChoiceProps<Value extends string> = {
  readonly legend: string;
  readonly name: string;
  readonly values: readonly Value[];
  readonly words: Readonly<Record<Value, string>>;
  readonly chosen: Value;
  readonly disabled: boolean;
  readonly draw: (value: Value) => { readonly code: string; readonly mesh: Mesh; readonly colour: StationColour };
  readonly choose: (value: Value) => void;
};

/** Chooses a mesh or a colour by the stamp it makes; the words say it to those who do not see it. */
export function StampChoice<Value extends string>({ legend, name, values, words, chosen, disabled, draw, choose }: StampChoiceProps<Value>) {
  return (
    <fieldset disabled={disabled}>
      <legend className="mb-1 text-[12.5px] font-semibold text-soft">{legend}: {words[chosen]}</legend>
      <div className="flex flex-wrap gap-1.5">
        {values.map((value) => (
          <label key={value} title={words[value]} className="rounded-[10px] border-2 border-transparent p-0.5 has-checked:border-ink has-focus-visible:outline-2 has-focus-visible:outline-ink">
            <input type="radio" name={name} value={value} checked={value === chosen} onChange={() => choose(value)} className="sr-only" />
            <Stamp {...draw(value)} size="medium" />
            <span className="sr-only">{words[value]}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
