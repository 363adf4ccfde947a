import { ButtonLink } from '@/components/button-link';
import type { BoardView } from '../board-view';
import { BoardAside } from './board-aside';
import { NotLive, ToFixLink, UndoButtons } from './board-head';
import { BoardNotices } from './board-notices';
import { BoardRoom } from './board-room';
import { ChosenBar } from './chosen-bar';
import { OthersHere } from './others-here';
import { PlanTabs } from './plan-tabs';
import { PlansButton } from './plans-button';
import { Rails } from './rails';

/** One plan as rails, cards and plates, with its check beside it. */
export function BoardScreen({ view }: { readonly view: BoardView }) {
  const { siteId, plan, plans, mayWrite } = view;
  const settings = {
    siteId, planId: plan.id, planName: plan.name, plans, stations: view.stations, liveContent: view.liveContent, mayWrite, mayFix: view.mayFix,
  };
  return (
    <BoardRoom key={plan.id} site={view.site} content={view.content} version={plan.version} proof={view.proof} settings={settings}>
      <div className="flex min-h-14 flex-wrap items-center gap-x-3.5 gap-y-2.5 px-4 pt-3.5 md:px-[22px]">
        <h1>Board</h1>
        <PlanTabs siteId={siteId} plans={plans} shown={plan.id} />
        {mayWrite ? <PlansButton /> : null}
        <NotLive livePlanName={view.livePlanName} />
        <OthersHere />
        <span className="flex-1" />
        {mayWrite ? null : <p className="text-[13px] text-soft">You may look at this board, not change it.</p>}
        <UndoButtons />
        <ButtonLink href={`/sites/${siteId}/try?plan=${plan.id}`}>Try an order</ButtonLink>
        <ToFixLink />
      </div>
      <div className="grid min-[1180px]:grid-cols-[minmax(0,1fr)_336px]">
        <div className="px-4 pt-3 pb-10 md:px-[22px]"><Rails /></div>
        <BoardAside />
      </div>
      <ChosenBar />
      <BoardNotices />
    </BoardRoom>
  );
}
