'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormPanel } from '@/components/form/form-panel';
import { TakeOffList } from '@/components/form/take-off-list';
import { useSavedForm, type Difference } from '@/components/form/use-saved-form';
import { ProblemError } from '@/lib/http/client';
import { saveMember, takeMemberOff } from '../api/people';
import { memberInput, type MemberInput } from '../schema';
import type { Member } from '../view';
import { roleWords } from '../words';
import { StandingFields } from './standing-fields';
import { useLeave } from './use-leave';

const facts = ({ role, title, mayOverride }: MemberInput): readonly (readonly [string, string])[] => [
  ['Role', roleWords[role]], ['Your word for it', title === '' ? 'none' : title], ['May override a stop', mayOverride ? 'yes' : 'no'],
];

const differences = (before: MemberInput, after: MemberInput): readonly Difference[] =>
  facts(before).flatMap(([label, from], index) => {
    const to = facts(after)[index]?.[1] ?? '';
    return from === to ? [] : [{ label, from, to }];
  });

const consequences = (member: Member): readonly string[] => [
  member.isYou ? 'You cannot open this site any more, as soon as it is done.' : 'They cannot open this site any more, from their next press on.',
  'What they changed stays in the history under their name.',
];

/** One person of the site: what they are, and taking them off. */
export function MemberPanel({ siteId, member }: { readonly siteId: string; readonly member: Member }) {
  const router = useRouter();
  const { leave, saved, readAgain } = useLeave();
  const [busy, setBusy] = useState(false);
  const [refused, setRefused] = useState('');
  const of = useSavedForm<MemberInput>({
    schema: memberInput,
    stored: { values: { role: member.role, title: member.title, mayOverride: member.mayOverride }, version: member.version },
    differences,
    save: (values, version) => saveMember(siteId, member.id, version, values),
    saved,
    readAgain,
  });
  const takeOff = async (): Promise<void> => {
    setBusy(true);
    try {
      await takeMemberOff(siteId, member.id, member.version);
      if (member.isYou) router.push('/sites');
      else saved();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      setRefused(error.problem.detail);
      readAgain();
    } finally {
      setBusy(false);
    }
  };
  return (
    <FormPanel
      title={member.name}
      of={of}
      leave={leave}
      below={(
        <>
          <TakeOffList name={member.name} busy={busy} takeOff={() => void takeOff()} consequences={consequences(member)} obstacles={member.isLastOwner ? ['A site always has an owner, and there is no other. Make somebody else an owner first.'] : []} />
          <p role="alert" className="text-[12.5px] font-semibold text-hot-text empty:hidden">{refused}</p>
        </>
      )}
    >
      <p className="text-[13.5px] text-soft">{member.email}</p>
      <StandingFields register={(field) => of.form.register(field)} role={of.typed.role} errors={of.form.formState.errors} />
    </FormPanel>
  );
}
