type LiveLineProps = {
  /** Null while no plan is live. */
  readonly live: { readonly plan: string; readonly inForce: string; readonly everywhere: boolean } | null;
};

const dot = 'mr-2 inline-block size-2 rounded-full';

/** What is live and where it is in force. A filled dot is everywhere, a half one not yet. */
export function LiveLine({ live }: LiveLineProps) {
  return (
    <p className="order-last w-full pb-1 text-quiet-on-night sm:order-none sm:w-auto sm:pb-0">
      {live === null ? (
        <><i aria-hidden className={`${dot} border border-quiet-on-night`} />No plan is live</>
      ) : (
        <>
          <i aria-hidden className={`${dot} ${live.everywhere ? 'bg-[#7cc79c]' : 'bg-[linear-gradient(90deg,#e3b75a_50%,#4a5349_50%)]'}`} />
          <b className="text-on-night">{live.plan}</b> is live, {live.inForce}
        </>
      )}
    </p>
  );
}
