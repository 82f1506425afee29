import type { Metadata } from 'next';
import localFont from 'next/font/local';
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

export default function RootLayout({ children }: Readonly<{ children: React.ReactNode }>) {
  return (
    <html lang="en" className={`${besley.variable} ${text.variable} ${mono.variable}`}>
      <body>{children}</body>
    </html>
  );
}
