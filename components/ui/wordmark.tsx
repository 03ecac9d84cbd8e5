import Link from 'next/link';

/** The name, with a double-ended hull and her outrigger seen from above. */
export function Wordmark({ href }: { readonly href: string }) {
  return (
    <Link href={href} className="text-ink inline-flex min-h-11 items-center gap-2 text-xl font-bold no-underline">
      <svg
        viewBox="0 0 44 24"
        aria-hidden="true"
        className="h-6 w-11"
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
      >
        <path d="M2 16Q22 9 42 16Q22 23 2 16Z" />
        <path d="M12 4Q22 1.5 32 4Q22 6.5 12 4Z" fill="currentColor" />
        <path d="M17 5v7M27 5v7" />
      </svg>
      Twobow
    </Link>
  );
}
