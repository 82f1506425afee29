/// <reference types="mdx" />
import type { MDXContent } from 'mdx/types';

type Document = () => Promise<{ default: MDXContent }>;

/** The compiled documents by lesson id; a test compares them with the files. */
export const documents: ReadonlyMap<string, Document> = new Map<string, Document>([
  [
    'train-of-toothed-wheels',
    () => import('@/content/lessons/toothed-wheels/train-of-toothed-wheels.mdx'),
  ],
  ['trammel-and-oval', () => import('@/content/lessons/drawing-and-copying/trammel-and-oval.mdx')],
  ['pantograph', () => import('@/content/lessons/drawing-and-copying/pantograph.mdx')],
]);
