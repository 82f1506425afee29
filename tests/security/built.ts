import { readFileSync } from 'node:fs';
import path from 'node:path';
import { root } from '../../scripts/machine/node.mjs';

/** A server action of a build. */
export interface BuiltAction {
  readonly id: string;
  readonly file: string;
  readonly name: string;
}

/** What a build serves, from its own manifests. */
export interface Built {
  readonly pages: readonly string[];
  readonly handlers: readonly string[];
  readonly actions: readonly BuiltAction[];
}

/** Files that the framework makes into routes of its own: nobody's data is in them. */
const ofTheFramework = new Set(['/_global-error', '/_not-found', '/icon.svg']);

/** Reads the manifests that the framework wrote into `distDir`. */
export function readBuilt(distDir: string): Built {
  const routes = Object.entries(
    readJson<Record<string, string>>(distDir, 'app-path-routes-manifest.json'),
  ).filter(([, route]) => !ofTheFramework.has(route));
  const references = readJson<References>(distDir, 'server/server-reference-manifest.json');
  const actions = [...Object.entries(references.node), ...Object.entries(references.edge)];
  return {
    pages: routes.filter(([file]) => file.endsWith('/page')).map(([, route]) => route),
    handlers: routes.filter(([file]) => file.endsWith('/route')).map(([, route]) => route),
    actions: actions.map(([id, { filename, exportedName }]) => ({
      id,
      file: filename,
      name: exportedName,
    })),
  };
}

/** The methods that a route handler's own file exports. */
export function methodsOf(route: string): string[] {
  const source = readFileSync(path.join(root, 'app', route, 'route.ts'), 'utf8');
  const methods = source.matchAll(/export (?:async )?(?:function|const) ([A-Z]+)\b/g);
  return [...methods].map(([, method = '']) => method);
}

interface References {
  readonly node: Readonly<Record<string, { filename: string; exportedName: string }>>;
  readonly edge: References['node'];
}

function readJson<Content>(distDir: string, file: string): Content {
  return JSON.parse(readFileSync(path.join(root, distDir, file), 'utf8')) as Content;
}
