/** The product's mark: a drum sieve seen from above. */
export function MeshMark({ size = 28 }: { readonly size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 30 30" aria-hidden>
      <circle cx="15" cy="15" r="13.2" fill="none" stroke="currentColor" strokeWidth="2.6" />
      <clipPath id="drum"><circle cx="15" cy="15" r="11" /></clipPath>
      <g clipPath="url(#drum)" stroke="#e9a58c" strokeWidth="1.3"><path d="M4 9h22M4 15h22M4 21h22M9 4v22M15 4v22M21 4v22" /></g>
      <circle cx="21" cy="15" r="2.6" fill="currentColor" />
    </svg>
  );
}
