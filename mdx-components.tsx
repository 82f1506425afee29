import type { ComponentProps } from 'react';
import type { MDXComponents } from 'mdx/types';
import { Card, Caution, FromDrawingToWood, See, Try } from '@/components/lesson/callouts';
import { Hook, Section } from '@/components/lesson/section';

/**
 * The names that every lesson may use. Those that need to know the lesson and its reader (Value,
 * Given, LessonBench, Prediction, WorkedExample, Exercise) are handed in by the lesson's page.
 */
const components: MDXComponents = {
  p: (props: ComponentProps<'p'>) => <p className="my-3 max-w-measure" {...props} />,
  ul: (props: ComponentProps<'ul'>) => (
    <ul className="my-3 max-w-measure list-disc space-y-1 pl-6" {...props} />
  ),
  ol: (props: ComponentProps<'ol'>) => (
    <ol className="my-3 max-w-measure list-decimal space-y-1 pl-6" {...props} />
  ),
  Card,
  Caution,
  FromDrawingToWood,
  Hook,
  Section,
  See,
  Try,
};

/** The names that a lesson may use. */
export function useMDXComponents(): MDXComponents {
  return components;
}
