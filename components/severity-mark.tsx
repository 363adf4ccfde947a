import { severityWords, type Severity } from '@/lib/domain/findings/finding';

/** Shape first, then colour: a triangle must be fixed, a square wants a look, a circle is worth knowing. */
export function SeverityMark({ severity, size = 18 }: { readonly severity: Severity; readonly size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 18 18" role="img" aria-label={severityWords[severity]} className="inline-block shrink-0">
      {severity === 'stop' && <path d="M9 0l9 18H0z" className="fill-hot" />}
      {severity === 'check' && <rect width="18" height="18" rx="3" className="fill-look" />}
      {severity === 'note' && <circle cx="9" cy="9" r="8.5" className="fill-quiet" />}
      <text x="9" y={severity === 'stop' ? 15.4 : 13.2} textAnchor="middle" fontSize="12" fontWeight="700" fill="#fff">{severity === 'stop' ? '!' : severity === 'check' ? '?' : 'i'}</text>
    </svg>
  );
}
