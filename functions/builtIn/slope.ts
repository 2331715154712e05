/** The slope of a polynomial through some readings of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Pairs } from './pairs';

export interface Slope {
  /** 1 for each reading that counts. */
  readonly inside: string;
  readonly points: string;
  readonly at: string;
  readonly degree: number;
  readonly nu: string;
}

/** The slope of a polynomial through some readings, as a rate: the five cells of the standard row. */
export function slopeRow(pairs: Pairs, { inside, points, at, degree, nu }: Slope): string[] {
  const distance = pairs.each(`${pairs.x}-${at}`);
  const terms = ['1', distance, ...Array.from({ length: degree - 1 }, (_, n) => `${distance}^${n + 2}`)];
  const fit = pairs.fit({ y: pairs.each(pairs.y), terms, weight: inside });
  const [k, size] = [degree + 1, pairs.size];
  const freedom = `(${points}-${k})`;
  return standardRowTexts({
    value: `INDEX(${fit},1,${degree})/${nu}`,
    // LINEST counts the readings outside among its degrees of freedom
    uncertainty: `INDEX(${fit},2,${degree})*SQRT(${size - k}/${freedom})/ABS(${nu})`,
    degreesOfFreedom: freedom,
  });
}
