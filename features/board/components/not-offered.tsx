'use client';

import { countWords } from '@/lib/domain/plans/words';
import type { SectionId } from '@/lib/domain/site/ids';
import { useBoard, useSettings, useStore } from './board-context';
import { useMakeEdit } from './use-make-edit';

/** Menu sections that this plan leaves out, each one press from being offered again. */
export function NotOffered() {
  const sections = useBoard((state) => state.board.notOffered);
  const { mayWrite, planName } = useSettings();
  const { site } = useStore();
  const make = useMakeEdit();
  if (sections.length === 0) return null;
  const offer = (section: SectionId, name: string): void =>
    make({ kind: 'offer', sections: [section], offered: true, all: site.menu.sections.map((each) => each.id) }, `${planName} now offers ${name}`);
  return (
    <section aria-labelledby="not-offered" className="mt-5 border-t border-line pt-3 text-[13px]">
      <h2 id="not-offered" className="font-[640]">Not offered in {planName}</h2>
      <ul className="mt-1 flex flex-wrap gap-x-5 gap-y-1">
        {sections.map((section) => (
          <li key={section.section} className="flex items-center gap-2">
            <span>{section.name}</span>
            <span className="text-quiet">{countWords(section.items, 'item')}</span>
            {mayWrite ? (
              <button type="button" aria-label={`Offer ${section.name}`} className="min-h-6 font-semibold underline underline-offset-3" onClick={() => offer(section.section, section.name)}>
                Offer
              </button>
            ) : null}
          </li>
        ))}
      </ul>
    </section>
  );
}
