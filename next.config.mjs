import path from 'node:path';
import createMDX from '@next/mdx';

/** Headers of every answer; the policy of a document, with its nonce, is set in proxy.ts. */
const securityHeaders = {
  'Strict-Transport-Security': 'max-age=31536000; includeSubDomains',
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  // Not `no-referrer`: with that, browsers send forms with an Origin of null, which is refused.
  'Referrer-Policy': 'same-origin',
  'Permissions-Policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=()',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
};

/** @type {import('next').NextConfig} */
const config = {
  distDir: process.env.HORNBEAM_DIST_DIR ?? '.next',
  pageExtensions: ['ts', 'tsx', 'mdx'],
  poweredByHeader: false,
  reactStrictMode: true,
  // The types are checked by `npm run typecheck`, once, not again in every build.
  typescript: { ignoreBuildErrors: true },
  agentRules: false,
  experimental: { agentUpgrade: false, authInterrupts: true },
  images: { unoptimized: true, remotePatterns: [] },
  headers: () =>
    Promise.resolve([
      {
        source: '/:path*',
        headers: Object.entries(securityHeaders).map(([key, value]) => ({ key, value })),
      },
    ]),
  serverExternalPackages: [
    'sequelize',
    'pg',
    'pg-hstore',
    'graphile-worker',
    'nodemailer',
    'rate-limiter-flexible',
    '@node-rs/argon2',
  ],
};

const withMDX = createMDX({
  options: {
    remarkPlugins: [
      'remark-frontmatter',
      ['remark-mdx-frontmatter', { name: 'frontMatter' }],
      'remark-gfm',
      'remark-math',
    ],
    rehypePlugins: [
      'rehype-slug',
      ['rehype-katex', { strict: 'error' }],
      path.join(import.meta.dirname, 'lib/mdx/rehype-strict.mjs'),
    ],
  },
});

export default withMDX(config);
