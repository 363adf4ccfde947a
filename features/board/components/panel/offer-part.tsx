'use client';

import { Button } from '@/components/button';
import type { SectionId } from '@/lib/domain/site/ids';
import { useSettings, useStore } from '../board-context';
import { useMakeEdit } from '../use-make-edit';
import { PanelPart } from './panel-part';

/** Leaves a section out of this plan; its rules stay, for the day it is offered again. */
export function OfferPart({ section, name, close }: { readonly section: SectionId; readonly name: string; readonly close: () => void }) {
  const { site } = useStore();
  const { mayWrite, planName } = useSettings();
  const make = useMakeEdit();
  if (!mayWrite) return null;
  return (
    <PanelPart title={`In ${planName}`}>
      <p className="text-[13px] text-soft">A section that is not offered cannot be ordered while {planName} is live. Where it prints is kept.</p>
      <div>
        <Button
          onClick={() => {
            make({ kind: 'offer', sections: [section], offered: false, all: site.menu.sections.map((each) => each.id) }, `${planName} no longer offers ${name}`);
            close();
          }}
        >
          Do not offer {name}
        </Button>
      </div>
    </PanelPart>
  );
}
