/** The way to the parts of a long page, for a phone. */
export function PageLinks({ links }: { readonly links: readonly (readonly [anchor: string, words: string])[] }) {
  return (
    <nav aria-label="On this page" className="mt-3 lg:hidden">
      <ul className="flex flex-wrap gap-x-4">
        {links.map(([anchor, words]) => (
          <li key={anchor}>
            <a href={`#${anchor}`} className="inline-flex min-h-11 items-center underline underline-offset-4">
              {words}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
