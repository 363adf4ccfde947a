'use client';

import { CardPanel } from './card-panel';
import { ChangesPanel } from './changes-panel';
import type { Opened } from './opened';
import { PlansPanel } from './plans-panel';
import { RulesPanel } from './rules-panel';
import { SendMenu } from './send-menu';

type OpenedLayerProps = { readonly opened: NonNullable<Opened>; readonly close: () => void };

/** What a press on the board opens; loaded after the first paint. */
export default function OpenedLayer({ opened, close }: OpenedLayerProps) {
  switch (opened.kind) {
    case 'send': return <SendMenu key={opened.cards.join()} cards={opened.cards} beside={opened.beside} close={close} />;
    case 'card': return <CardPanel key={opened.card} cardId={opened.card} close={close} />;
    case 'rules': return <RulesPanel close={close} />;
    case 'plans': return <PlansPanel close={close} />;
    case 'changes': return <ChangesPanel close={close} />;
  }
}
