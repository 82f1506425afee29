import path from 'node:path';
import createMDX from '@next/mdx';

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
