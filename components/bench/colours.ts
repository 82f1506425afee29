import type { Token } from '@/lib/scene/appearance';

/** The page's tokens and faces as the canvas needs them: resolved, not as variables. */
export interface Ink {
  readonly colour: (token: Token) => string;
  readonly figure: string;
  readonly name: string;
}

/** Reads the tokens where `element` stands, so that the canvas is drawn in the page's own colours. */
export function readInk(element: Element): Ink {
  const style = getComputedStyle(element);
  const variable = (name: string) => style.getPropertyValue(`--${name}`).trim();
  const known = new Map<Token, string>();
  return {
    colour: (token) => {
      const found = known.get(token) ?? (variable(token) || 'gray');
      known.set(token, found);
      return found;
    },
    figure: variable('font-mono') || 'monospace',
    name: variable('font-text') || 'sans-serif',
  };
}

/** Calls back when the page turns from light to dark or the other way; returns how to stop. */
export function onThemeChange(changed: () => void): () => void {
  const dark = window.matchMedia('(prefers-color-scheme: dark)');
  dark.addEventListener('change', changed);
  const watcher = new MutationObserver(changed);
  watcher.observe(document.documentElement, {
    attributes: true,
    attributeFilter: ['class', 'data-theme', 'style'],
  });
  return () => {
    dark.removeEventListener('change', changed);
    watcher.disconnect();
  };
}
