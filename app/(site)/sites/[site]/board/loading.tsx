/** The rails without their paper, while the plan is read. */
export default function BoardLoading() {
  return (
    <div role="status" className="grid gap-2.5 px-4 pt-4 md:px-[22px]">
      <p className="text-[13px] text-soft">Reading the plan</p>
      {['one', 'two', 'three', 'four'].map((rail) => <div key={rail} aria-hidden className="h-[94px] rounded-[9px] border border-line bg-panel" />)}
    </div>
  );
}
