/** The shape of a page while it is read. */
export default function SiteLoading() {
  return (
    <div role="status" className="grid gap-2.5 px-4 pt-4 md:px-[22px]">
      <p className="text-[13px] text-soft">Reading the site</p>
      {['one', 'two', 'three'].map((line) => <div key={line} aria-hidden className="h-16 rounded-[9px] border border-line bg-panel" />)}
    </div>
  );
}
