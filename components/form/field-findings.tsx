import { SeverityMark } from '@/components/severity-mark';
import type { Finding, Fix } from '@/lib/domain/findings/finding';

type FieldFindingsProps = {
  readonly findings: readonly Finding[];
  /** Puts a fix into the form; null leaves out those that are about something else. */
  readonly fixIn: (fix: Fix) => (() => void) | null;
};

/** What the checks say of one field while it is typed, each with its mend as a button. */
export function FieldFindings({ findings, fixIn }: FieldFindingsProps) {
  return findings.map((finding) => (
    <div key={finding.code} className={`rounded-md border px-2.5 py-2 text-[12.5px] ${finding.severity === 'stop' ? 'border-hot bg-hot-tint' : 'border-look bg-look-tint'}`}>
      <p className={`flex items-center gap-1.5 font-semibold ${finding.severity === 'stop' ? 'text-hot-text' : 'text-look-text'}`}>
        <SeverityMark severity={finding.severity} size={15} />
        <span>{finding.title}</span>
      </p>
      <p className="text-soft">{finding.message}</p>
      {finding.fixes.flatMap((fix) => {
        const press = fixIn(fix);
        return press === null ? [] : [
          <button key={fix.label} type="button" onClick={press} className="mr-3 min-h-8 font-semibold underline underline-offset-3">{fix.label}</button>,
        ];
      })}
    </div>
  ));
}
