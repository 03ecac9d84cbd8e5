/** The reefs called on a leg, one under the other. */
export function ReefLines({ reefs }: { readonly reefs: readonly string[] }) {
  if (reefs.length === 0) return <>not known</>;
  return (
    <ul>
      {reefs.map((reef) => (
        <li key={reef}>{reef}</li>
      ))}
    </ul>
  );
}
