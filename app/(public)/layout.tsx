import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { ThemeSwitch } from '@/components/ui/theme-switch';
import { Wordmark } from '@/components/ui/wordmark';
import { themeOf } from '@/lib/web/theme';

/** The frame of the pages before one is signed in. */
export default async function PublicLayout({ children }: { readonly children: ReactNode }) {
  const theme = themeOf((await cookies()).get('theme')?.value);
  return (
    <>
      <header className="mx-auto flex max-w-5xl items-center justify-between gap-4 px-4 py-3 md:px-8">
        <Wordmark href="/" />
        <ThemeSwitch initial={theme} />
      </header>
      <main id="content" tabIndex={-1} className="mx-auto max-w-5xl px-4 py-6 outline-none md:px-8">
        {children}
      </main>
    </>
  );
}
