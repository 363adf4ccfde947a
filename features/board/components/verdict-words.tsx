import type { ProofSummary } from '@/lib/domain/proof/summary';
import { verdictOf } from '@/lib/domain/proof/summary';

export function VerdictWords({ summary }: { readonly summary: ProofSummary }) {
  return (
    <h2 className="text-[27px] leading-[1.06] font-[680] tracking-[-0.02em] font-stretch-[104%] text-balance">
      {verdictOf(summary).map((part) => (part.hot
        ? <em key={part.words} className="text-hot-text not-italic">{part.words}</em>
        : <span key={part.words}>{part.words}</span>))}
    </h2>
  );
}
