'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';

/** A link of the frame that says whether one is there. */
export function NavLink({ href, children }: { readonly href: string; readonly children: ReactNode }) {
  const path = usePathname();
  const here = path === href || path.startsWith(`${href}/`);
  return (
    <Link
      href={href}
      aria-current={here ? 'page' : undefined}
      className={`inline-flex min-h-11 items-center border-b-2 px-1 font-bold no-underline ${here ? 'border-spruce text-ink' : 'text-muted hover:border-line border-transparent'}`}
    >
      {children}
    </Link>
  );
}
