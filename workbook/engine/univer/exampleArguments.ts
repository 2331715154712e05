/**
 * The arguments of a call as they stand in its text: `=PACE.EVENT({40;25},2)` → `{40;25}` and `2`.
 * Commas inside brackets and quotes separate nothing.
 */
export function exampleArguments(formula: string): string[] {
  const inside = formula.slice(formula.indexOf('(') + 1, formula.lastIndexOf(')'));
  const parts = inside.match(/"(?:[^"]|"")*"|[^"]/g) ?? [];
  const args = [''];
  let depth = 0;
  for (const part of parts) {
    if (part === '(' || part === '{') depth += 1;
    if (part === ')' || part === '}') depth -= 1;
    if (part === ',' && depth === 0) args.push('');
    else args[args.length - 1] += part;
  }
  return args.map((argument) => argument.trim());
}
