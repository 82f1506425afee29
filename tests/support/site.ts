import type { DatabaseUrls } from './cluster';

/** Where the site under test is served; told to the test processes in one variable. */
export interface SiteAddress {
  readonly address: string;
  readonly mailFolder: string;
  readonly database: DatabaseUrls;
  readonly distDir: string;
}

export const siteVariable = 'HORNBEAM_TEST_SITE';

export function site(): SiteAddress {
  const told = process.env[siteVariable];
  if (!told) throw new Error('The site is not running: tests/support/site-setup starts it.');
  return JSON.parse(told) as SiteAddress;
}
