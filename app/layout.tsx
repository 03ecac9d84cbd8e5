import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { SkipLink } from '@/components/ui/skip-link';
import { themeOf } from '@/lib/web/theme';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Twobow', template: '%s · Twobow' },
  description: 'Coastal passages for small shunting craft: moments, reef calls and shunts, leg by leg.',
  robots: { index: false },
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1 };

export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const theme = themeOf((await cookies()).get('theme')?.value);
  return (
    <html lang="en" data-theme={theme}>
      <body>
        <SkipLink />
        {children}
      </body>
    </html>
  );
}
