import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { Providers } from '@/components/layout/providers';
import { readTheme, themeCookie } from '@/lib/theme';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Witnessmark', template: '%s · Witnessmark' },
  description: 'Prove the geometry of a turning machine, and find every report again by its serial number.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1 };

/** The theme comes from a cookie, so that the first picture already has it. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = readTheme((await cookies()).get(themeCookie)?.value);
  return (
    <html lang="en" data-theme={theme === 'system' ? undefined : theme} suppressHydrationWarning>
      <body className="min-h-dvh">
        <Providers>{children}</Providers>
      </body>
    </html>
  );
}
