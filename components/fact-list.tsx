/** Labels and values, for reading. */
export function FactList({ facts }: { readonly facts: readonly { readonly label: string; readonly value: string }[] }) {
  return (
    <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 text-[13.5px]">
      {facts.map(({ label, value }) => (
        <div key={label} className="contents"><dt className="text-soft">{label}</dt><dd className="break-words">{value}</dd></div>
      ))}
    </dl>
  );
}
