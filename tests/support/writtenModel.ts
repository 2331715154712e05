/**
 * A least-squares model from a formula as it is printed. Derivatives are worked out by mathjs, so that nothing of
 * ours stands between the formula and the search.
 */
import { derivative, parse, type MathNode } from 'mathjs';
import type { LeastSquaresModel } from '../../src/numerics/leastSquares';

type Compiled = (parameters: Float64Array, row: Readonly<Record<string, number>>) => number;

/** mathjs's own evaluation takes a minute for all of NIST's sets; the same tree as a function takes a second. */
function compiled(node: MathNode, parameters: readonly string[]): Compiled {
  const text = node
    .toString({ parenthesis: 'all' })
    .replaceAll('^', '**')
    .replace(/[A-Za-z_]\w*/g, (word) => {
      if (/^(exp|log|sin|cos|atan|sqrt)$/.test(word)) return `Math.${word}`;
      if (word === 'pi') return 'Math.PI';
      const place = parameters.indexOf(word);
      return place >= 0 ? `b[${place}]` : `row.${word}`;
    });
  return new Function('b', 'row', `return ${text};`) as Compiled;
}

/**
 * @param model in the syntax of mathjs, `**` allowed for powers
 * @param parameters names in it that are to be found
 * @param data columns by name
 * @param readings what the model should meet
 */
export function writtenModel(
  model: string,
  parameters: readonly string[],
  data: Readonly<Record<string, readonly number[]>>,
  readings: readonly number[],
): LeastSquaresModel {
  const text = model.replaceAll('**', '^');
  const value = compiled(parse(text), parameters);
  const slopes = parameters.map((name) => compiled(derivative(text, name), parameters));
  const rows = readings.map((_, i) =>
    Object.fromEntries(Object.entries(data).map(([name, column]) => [name, column[i]])),
  );
  return {
    parameters: parameters.length,
    residuals: readings.length,
    residualsAt: (found, residuals) =>
      rows.forEach((row, i) => (residuals[i] = readings[i] - value(found, row))),
    derivativesAt: (found, columns) =>
      slopes.forEach((slope, j) => rows.forEach((row, i) => (columns[j][i] = slope(found, row)))),
  };
}
