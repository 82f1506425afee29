import type { MDXComponents } from 'mdx/types';

const components: MDXComponents = {};

/** The names that a lesson may use. */
export function useMDXComponents(): MDXComponents {
  return components;
}
