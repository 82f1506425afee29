import type { Metadata, Viewport } from 'next';
import localFont from 'next/font/local';
import { readerUnits } from '@/lib/auth/reader-units';
import { currentViewer } from '@/lib/auth/viewer';
import { WaitingNotice } from '@/components/exercise/waiting-notice';
import { QueryProvider } from '@/lib/browser/query-provider';
import { SiteFooter } from './_components/site-footer';
import { SiteHeader } from './_components/site-header';
import { SkipLink } from './_components/skip-link';
import './globals.css';

const besley = localFont({
  src: [
    { path: '../fonts/besley/besley-latin-400-normal.woff2', weight: '400' },
    { path: '../fonts/besley/besley-latin-600-normal.woff2', weight: '600' },
    { path: '../fonts/besley/besley-latin-700-normal.woff2', weight: '700' },
  ],
  variable: '--font-besley',
});
const text = localFont({
  src: [
    {
      path: '../fonts/atkinson-hyperlegible-next/atkinson-hyperlegible-next-latin-wght-normal.woff2',
      style: 'normal',
    },
    {
      path: '../fonts/atkinson-hyperlegible-next/atkinson-hyperlegible-next-latin-wght-italic.woff2',
      style: 'italic',
    },
  ],
  weight: '200 800',
  variable: '--font-text',
});
const mono = localFont({
  src: '../fonts/atkinson-hyperlegible-mono/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--font-mono',
});

export const metadata: Metadata = {
  title: { default: 'Hornbeam', template: '%s · Hornbeam' },
  description: 'The mechanisms that move wooden things, for people who make them.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#fbfaf5' },
    { media: '(prefers-color-scheme: dark)', color: '#161a17' },
  ],
};

export default async function RootLayout({ children }: Readonly<{ children: React.ReactNode }>) {
  // Reading the session also makes every document when it is asked for: a nonce never reaches a
  // page made at build time.
  const [viewer, units] = await Promise.all([currentViewer(), readerUnits()]);
  return (
    <html
      lang="en-GB"
      className={`${besley.variable} ${text.variable} ${mono.variable}`}
      data-motion={viewer?.reducedMotion ? 'less' : undefined}
    >
      <body>
        <SkipLink />
        <QueryProvider>
          <SiteHeader viewer={viewer} units={units} />
          <WaitingNotice personId={viewer?.personId ?? null} signInHref="/sign-in" />
          {children}
          <SiteFooter />
        </QueryProvider>
      </body>
    </html>
  );
}
