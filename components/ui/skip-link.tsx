export function SkipLink() {
  return (
    <a
      href="#content"
      className="bg-spruce text-on-spruce sr-only px-4 py-3 font-bold focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50"
    >
      Skip to the page
    </a>
  );
}
