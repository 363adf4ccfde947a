'use client';

import { useRef } from 'react';
import styles from './menu.module.css';

type TickListProps = {
  readonly label: string;
  readonly none: string;
  readonly choices: readonly { readonly value: string; readonly words: string }[];
  readonly chosen: readonly string[];
  readonly change: (chosen: readonly string[]) => void;
};

/** Several choices in the room of one cell: what is chosen in words, the list when it is opened. */
export function TickList({ label, none, choices, chosen, change }: TickListProps) {
  const box = useRef<HTMLDetailsElement>(null);
  const words = choices.filter((choice) => chosen.includes(choice.value)).map((choice) => choice.words).join(', ');
  return (
    <details
      ref={box}
      className="relative"
      name="menu-cell"
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || box.current === null) return;
        box.current.open = false;
        box.current.querySelector('summary')?.focus();
      }}
    >
      <summary aria-label={`${label}: ${words === '' ? none : words}`} className="max-w-44 list-none truncate [&::-webkit-details-marker]:hidden">{words === '' ? <span className="text-quiet">{none}</span> : words}</summary>
      <fieldset className={styles['popover']}>
        <legend className="sr-only">{label}</legend>
        {choices.length === 0 ? <p className="text-quiet">None on this site yet.</p> : choices.map(({ value, words: said }) => (
          <label key={value} className="flex min-h-8 items-center gap-2">
            <input type="checkbox" checked={chosen.includes(value)} onChange={(event) => change(event.target.checked ? [...chosen, value] : chosen.filter((one) => one !== value))} />
            {said}
          </label>
        ))}
      </fieldset>
    </details>
  );
}
