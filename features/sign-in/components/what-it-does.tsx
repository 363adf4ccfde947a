import { Stamp } from '@/components/stamp';
import type { Mesh, StationColour } from '@/lib/domain/site/station';

type Example = { readonly section: string; readonly station: string; readonly printer: string; readonly code: string; readonly mesh: Mesh; readonly colour: StationColour };

const examples: readonly Example[] = [
  { section: 'Burgers', station: 'Grill', printer: 'GRILL1', code: 'GR', mesh: 'square', colour: 'brick' },
  { section: 'Salads', station: 'Larder', printer: 'LARDER1', code: 'LD', mesh: 'diagonal', colour: 'slate' },
  { section: 'Desserts', station: 'Pastry', printer: 'PASTRY1', code: 'PY', mesh: 'bars', colour: 'mustard' },
];

/** The job in one sentence, and three orders' ways as the kitchen would say them. */
export function WhatItDoes() {
  return (
    <section className="grid content-start gap-7">
      <p className="max-w-[17ch] text-[34px] leading-[1.04] font-[680] tracking-[-0.02em] text-balance font-stretch-[108%] md:text-[50px]">Tamis sorts every order to the station that cooks it.</p>
      <ul className="hidden gap-3 md:grid">
        {examples.map(({ section, station, printer, ...stamp }) => (
          <li key={station} className="flex items-center gap-3.5 text-[17px] text-soft">
            <Stamp {...stamp} />
            <span><b className="text-ink">{section}</b> go to <b className="text-ink">{station}</b>, and print on <span className="font-mono text-[16px] font-semibold text-ink">{printer}</span>.</span>
          </li>
        ))}
      </ul>
      <p className="hidden max-w-[46ch] text-[13.5px] text-soft md:block">A ticket is an aid. People confirm allergies by voice and by the house’s own procedure.</p>
    </section>
  );
}
