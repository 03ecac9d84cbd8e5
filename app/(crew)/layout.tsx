import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { NavLink } from '@/components/ui/nav-link';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { Wordmark } from '@/components/ui/wordmark';
import { requireUser } from '@/lib/web/session';
import { themeOf } from '@/lib/web/theme';

/** The frame of signed-in people. Each page asks for its own access besides. */
export default async function CrewLayout({ children }: { readonly children: ReactNode }) {
  await requireUser();
  const theme = themeOf((await cookies()).get('theme')?.value);
  return (
    <>
      <header className="border-line bg-panel border-b print:hidden">
        <div className="mx-auto flex max-w-[96rem] flex-wrap items-center justify-between gap-x-6 gap-y-1 px-4 py-2 md:px-8">
          <Wordmark href="/passages" />
          <nav
            aria-label="Main"
            className="order-last flex w-full flex-wrap items-center gap-x-5 md:order-none md:ml-auto md:w-auto"
          >
            <NavLink href="/passages">Passages</NavLink>
            <NavLink href="/boats">Boats</NavLink>
            <NavLink href="/account">Account</NavLink>
          </nav>
          <ThemeSwitch initial={theme} />
        </div>
      </header>
      <main id="content" tabIndex={-1} className="mx-auto max-w-[96rem] px-4 py-6 outline-none md:px-8 md:py-8">
        {children}
      </main>
    </>
  );
}
