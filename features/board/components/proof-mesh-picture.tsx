import type { ProofMesh } from '@/lib/domain/proof/summary';

const columns = 30;
const cellPx = 10;

/** All ways to order as one sieve; where the weave is torn, an order would fall through. */
export function ProofMeshPicture({ mesh }: { readonly mesh: ProofMesh }) {
  const rows = Math.ceil(mesh.cells / columns);
  const words = mesh.lost.length === 0 ? 'The sieve holds: no way to order falls through.' : `The sieve is torn in ${mesh.lost.length} of ${mesh.cells} places.`;
  return (
    <svg
      role="img"
      aria-label={words}
      viewBox={`0 0 ${columns * cellPx + 1} ${rows * cellPx + 1}`}
      preserveAspectRatio="none"
      className="h-11 w-full rounded-[4px] border border-line-strong bg-calm-tint text-calm-text"
    >
      {Array.from({ length: columns * 2 + 1 }, (_, line) => (
        <path key={`v${line}`} d={`M${line * (cellPx / 2) + 0.5} 0V${rows * cellPx + 1}`} stroke="currentColor" />
      ))}
      {Array.from({ length: rows * 2 + 1 }, (_, line) => (
        <path key={`h${line}`} d={`M0 ${line * (cellPx / 2) + 0.5}H${columns * cellPx + 1}`} stroke="currentColor" />
      ))}
      {mesh.lost.map((cell) => (
        <rect key={cell} x={(cell % columns) * cellPx + 1} y={Math.floor(cell / columns) * cellPx + 1} width={cellPx - 1} height={cellPx - 1} className="fill-hot" />
      ))}
    </svg>
  );
}
