import { FindingCard } from '@/components/finding-card';
import type { Finding } from '@/lib/domain/findings/finding';
import { mayFix } from '@/lib/domain/findings/fix-permissions';
import type { Membership } from '@/lib/domain/roles/permissions';
import { FixButtons } from './fix-buttons';

type FindingListProps = { readonly siteId: string; readonly membership: Membership; readonly findings: readonly Finding[] };

const onBoard = (kind: string): boolean => kind === 'send-sections' || kind === 'remove-rule';

/** Findings with the fixes that this person may press. */
export function FindingList({ siteId, membership, findings }: FindingListProps) {
  return findings.map((finding) => {
    const fixes = finding.fixes.filter((fix) => mayFix(membership, fix) && !onBoard(fix.kind));
    return (
      <FindingCard key={`${finding.code} ${finding.subject.id} ${finding.subject.till ?? ''}`} severity={finding.severity} title={finding.title} message={finding.message}>
        {fixes.length === 0 ? null : <FixButtons siteId={siteId} fixes={fixes} />}
      </FindingCard>
    );
  });
}
