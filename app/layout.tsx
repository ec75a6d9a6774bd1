import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { getActor, type Actor } from '@/lib/auth/session';
import { Providers } from './providers';
import { isTheme, THEME_COOKIE } from './_components/theme-cookie';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Cellarsun', template: '%s, Cellarsun' },
  description: 'Light, warmth and the bill of a tent for growing, worked out as you draw it.',
  formatDetection: { telephone: false, email: false, address: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f7f4ec' },
    { media: '(prefers-color-scheme: dark)', color: '#171b1d' },
  ],
};

/** A database that is down must not take the frame with it: the page inside says what is wrong. */
async function whoIsHere(): Promise<Actor | null> {
  try {
    return await getActor();
  } catch {
    return null;
  }
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  const jar = await cookies();
  const actor = await whoIsHere();
  const kept = jar.get(THEME_COOKIE)?.value;
  const theme = actor?.theme ?? (isTheme(kept) ? kept : 'system');
  return (
    <html lang="en" {...(theme !== 'system' && { 'data-theme': theme })}>
      <body>
        <a
          href="#main"
          className="absolute top-2 left-2 z-50 -translate-y-20 bg-ink px-4 py-3 text-paper focus:translate-y-0"
        >
          Skip to the page
        </a>
        <Providers units={actor?.unitSystem ?? 'metric'}>{children}</Providers>
      </body>
    </html>
  );
}
