'use client';

import { useState } from 'react';
import { Button } from '@/components/button';

type TakeOffListProps = {
  readonly name: string;
  readonly consequences: readonly string[];
  readonly obstacles: readonly string[];
  readonly takeOff: () => void;
  readonly busy: boolean;
};

/** Deleting in two presses, with what hangs on it said before the second. */
export function TakeOffList({ name, consequences, obstacles, takeOff, busy }: TakeOffListProps) {
  const [asked, setAsked] = useState(false);
  if (!asked) return <div><Button onClick={() => setAsked(true)}>Take {name} off the list</Button></div>;
  const stays = obstacles.length > 0;
  return (
    <div role="group" aria-label={`Take ${name} off the list`} className="grid gap-2 rounded-lg border-[1.5px] border-hot bg-hot-tint p-3 text-[13.5px]">
      <p className="font-semibold">{stays ? `${name} has to stay for now.` : `Take ${name} off the list?`}</p>
      {[...obstacles, ...(stays ? [] : consequences)].map((words) => <p key={words}>{words}</p>)}
      <div className="flex flex-wrap gap-2">
        {stays ? null : <Button kind="hot" disabled={busy} onClick={takeOff}>Take it off</Button>}
        <Button autoFocus onClick={() => setAsked(false)}>Keep it</Button>
      </div>
    </div>
  );
}
