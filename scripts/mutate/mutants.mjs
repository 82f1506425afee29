import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

const turned = new Map([
  [ts.SyntaxKind.PlusToken, '-'],
  [ts.SyntaxKind.MinusToken, '+'],
  [ts.SyntaxKind.AsteriskToken, '/'],
  [ts.SyntaxKind.SlashToken, '*'],
  [ts.SyntaxKind.PercentToken, '*'],
  [ts.SyntaxKind.PlusEqualsToken, '-='],
  [ts.SyntaxKind.MinusEqualsToken, '+='],
  [ts.SyntaxKind.AsteriskEqualsToken, '/='],
  [ts.SyntaxKind.SlashEqualsToken, '*='],
  [ts.SyntaxKind.LessThanToken, '>='],
  [ts.SyntaxKind.LessThanEqualsToken, '>'],
  [ts.SyntaxKind.GreaterThanToken, '<='],
  [ts.SyntaxKind.GreaterThanEqualsToken, '<'],
  [ts.SyntaxKind.EqualsEqualsEqualsToken, '!=='],
  [ts.SyntaxKind.ExclamationEqualsEqualsToken, '==='],
  [ts.SyntaxKind.AmpersandAmpersandToken, '||'],
  [ts.SyntaxKind.BarBarToken, '&&'],
]);

const swapped = new Map([
  ['Math.min', 'Math.max'],
  ['Math.max', 'Math.min'],
  ['Math.sin', 'Math.cos'],
  ['Math.cos', 'Math.sin'],
  ['Math.floor', 'Math.ceil'],
  ['Math.ceil', 'Math.floor'],
]);

/**
 * Every single change of a constant or an operator in the modules of `folder`: a number one larger,
 * an operator turned into its opposite. A comparison is turned round, not shifted by its boundary:
 * measured numbers do not lie on boundaries. What an error says is left alone.
 */
export function mutantsIn(root, folder) {
  return filesIn(root, folder, '.ts').flatMap((file) =>
    mutantsOf(file, readFileSync(path.join(root, file), 'utf8')),
  );
}

/** Every file under `folder` whose name ends so, from the root. */
export function filesIn(root, folder, ending) {
  return readdirSync(path.join(root, folder), { recursive: true })
    .filter((name) => name.endsWith(ending))
    .map((name) => `${folder}/${name}`)
    .sort();
}

/** The mutants of one module: `{ file, line, from, to, start, end }`. */
export function mutantsOf(file, text) {
  const source = ts.createSourceFile(file, text, ts.ScriptTarget.ES2022, true);
  const found = [];
  const add = (node, to) => {
    const start = node.getStart(source);
    const { line } = source.getLineAndCharacterOfPosition(start);
    found.push({ file, line: line + 1, from: node.getText(source), to, start, end: node.end });
  };
  const visit = (node) => {
    if (ts.isTypeNode(node) || ts.isImportDeclaration(node) || ts.isThrowStatement(node)) return;
    if (ts.isNumericLiteral(node)) add(node, String(Number(node.text.replaceAll('_', '')) + 1));
    if (ts.isBinaryExpression(node)) {
      const to = turned.get(node.operatorToken.kind);
      if (to) add(node.operatorToken, to);
    }
    if (ts.isPropertyAccessExpression(node)) {
      const to = swapped.get(node.getText(source));
      if (to) add(node, to);
    }
    if (node.kind === ts.SyntaxKind.TrueKeyword) add(node, 'false');
    if (node.kind === ts.SyntaxKind.FalseKeyword) add(node, 'true');
    if (ts.isPrefixUnaryExpression(node)) {
      const removed = [ts.SyntaxKind.MinusToken, ts.SyntaxKind.ExclamationToken];
      if (removed.includes(node.operator)) add(node, `(${node.operand.getText(source)})`);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

/** The text of a module with one change in it. */
export function mutated(text, { start, end, to }) {
  return text.slice(0, start) + to + text.slice(end);
}

/** `count` of some things, the same ones for the same seed. */
export function sampled(things, count, seed) {
  const left = [...things];
  let state = seed >>> 0;
  const chosen = [];
  while (chosen.length < count && left.length > 0) {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    const [one] = left.splice(Math.floor((state / 2 ** 32) * left.length), 1);
    chosen.push(one);
  }
  return chosen;
}
