/** The steel rail below the bar, from which pages and paper hang. */
export function Rail({ className = '' }: { readonly className?: string }) {
  return <div aria-hidden className={`h-[11px] bg-(image:--rail) shadow-[0_1px_2px_rgb(0_0_0/0.2)] ${className}`} />;
}
