/** The examples in docstrings, `call(args) // expected`, found with TypeScript's own parser and compared. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';

export interface ExportedFunction {
  readonly file: string;
  readonly name: string;
  readonly examples: readonly { readonly call: string; readonly expected: string }[];
}

/** Every TypeScript source below a folder. */
export function sourcesBelow(folder: string): string[] {
  return readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts') && !file.endsWith('.d.ts'))
    .map((file) => join(folder, file))
    .sort();
}

export function exportedFunctions(file: string): ExportedFunction[] {
  const source = ts.createSourceFile(file, readFileSync(file, 'utf8'), ts.ScriptTarget.Latest, true);
  return source.statements.filter(isExported).flatMap((statement) => {
    if (ts.isFunctionDeclaration(statement)) return [described(file, statement.name!.text, statement)];
    if (!ts.isVariableStatement(statement)) return [];
    return statement.declarationList.declarations
      .filter(
        ({ initializer }) =>
          initializer && (ts.isArrowFunction(initializer) || ts.isFunctionExpression(initializer)),
      )
      .map((declaration) => described(file, declaration.name.getText(), declaration));
  });
}

const isExported = (statement: ts.Statement): boolean =>
  ts.canHaveModifiers(statement) &&
  !!ts.getModifiers(statement)?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword);

function described(file: string, name: string, node: ts.Node): ExportedFunction {
  const tags = ts.getJSDocTags(node).filter(({ tagName }) => tagName.text === 'example');
  const examples = tags.map(({ comment }) => {
    const text = (ts.getTextOfJSDocComment(comment) ?? '').replaceAll(/\s*\n\s*/g, ' ').trim();
    const cut = text.lastIndexOf(' // ');
    if (cut === -1) throw new Error(`an example must read "call // expected": ${file}, ${name}: ${text}`);
    return { call: text.slice(0, cut), expected: text.slice(cut + 4) };
  });
  return { file, name, examples };
}

/** A number as it is printed. */
class Printed {
  constructor(readonly text: string) {}

  /**
   * Four digits or more are rounded: half of the last is allowed. Fewer are meant exactly, but for the last
   * places of the arithmetic.
   */
  get allowed(): number {
    const [, whole, fraction = '', exponent = '0'] = /^-?(\d+)\.?(\d*)(?:e([+-]?\d+))?$/i.exec(this.text)!;
    const significant = (whole + fraction).replace(/^0+/, '').length;
    const value = Math.abs(Number(this.text));
    if (significant < 4) return 1e-9 * Math.max(1e-3, value);
    return Math.max(0.5001 * 10 ** (Number(exponent) - fraction.length), 1e-14 * value);
  }
}

const numberText = /(?<![\w.'])-?\d+(?:\.\d+)?(?:e[+-]?\d+)?(?![\w'])/gi;

function expectedValue(text: string): unknown {
  if (text.startsWith("'")) return new Function(`return ${text}`)();
  const plain = text.replace(/^Float64Array |^Int32Array /, '');
  const source = plain.replaceAll(numberText, (digits) => `new Printed(${JSON.stringify(digits)})`);
  return new Function('Printed', `return (${source})`)(Printed);
}

/** Why a value is not what the example says, or nothing. An object may hold more than the example shows. */
export function difference(actual: unknown, expected: unknown): string | undefined {
  if (expected instanceof Printed) {
    const off = Math.abs(Number(actual) - Number(expected.text));
    return typeof actual === 'number' && off <= expected.allowed
      ? undefined
      : `${String(actual)} is not ${expected.text}`;
  }
  if (typeof expected !== 'object' || expected === null) {
    return Object.is(actual, expected) ? undefined : `${String(actual)} is not ${String(expected)}`;
  }
  if (typeof actual !== 'object' || actual === null) return `${String(actual)} is no object`;
  const parts = actual as Readonly<Record<string, unknown>>;
  if (Array.isArray(expected) && parts.length !== expected.length)
    return `${String(parts.length)} entries, not ${expected.length}`;
  for (const [key, part] of Object.entries(expected)) {
    const why = difference(parts[key], part);
    if (why) return `${key}: ${why}`;
  }
  return undefined;
}

/** Evaluates a call with some names in scope and compares; `throws …` expects that message. */
export function checkExample(
  call: string,
  expected: string,
  scope: Readonly<Record<string, unknown>>,
): string | undefined {
  const evaluate = (): unknown =>
    new Function(...Object.keys(scope), `return (${call})`)(...Object.values(scope));
  if (!expected.startsWith('throws ')) return difference(evaluate(), expectedValue(expected));
  try {
    return `${String(evaluate())} came back, nothing was thrown`;
  } catch (error) {
    const { message } = error as Error;
    return message === expected.slice('throws '.length) ? undefined : `threw "${message}"`;
  }
}
